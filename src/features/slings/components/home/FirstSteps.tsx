import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { mayCall, type RouteKey } from '../../../../../shared/domain/access/routes';
import { Panel } from '../../../../components/ui/Panel';
import { paths } from '../../../../config/paths';
import { useUser } from '../../../../lib/session';

interface FirstStep {
  title: string;
  text: string;
  to: string;
  needs: RouteKey;
  /** Who does it, where this person may not. */
  who: string;
}

const STEPS: readonly FirstStep[] = [
  {
    title: 'Name the racks and cages',
    text: 'Each site needs a cage at least: a held sling is brought there.',
    to: paths.sites,
    needs: 'POST /api/locations',
    who: 'An administrator',
  },
  {
    title: 'Bring the people in',
    text: 'An account for each storekeeper, inspector and manager, with site, roles and designations.',
    to: paths.users,
    needs: 'POST /api/users',
    who: 'An administrator',
  },
  {
    title: 'Register the first sling',
    text: 'From the sling and its maker’s tag.',
    to: paths.newSling,
    needs: 'POST /api/slings',
    who: 'A storekeeper, inspector or manager',
  },
  {
    title: 'Try your printer',
    text: 'A test page finds the smallest code that it prints well.',
    to: paths.printerTest,
    needs: 'GET /api/label-stocks/:id/test-page',
    who: 'A storekeeper, inspector or manager',
  },
  {
    title: 'Print its label and confirm it',
    text: 'Fix the label to the sling, scan it there and type the last four characters.',
    to: paths.labels,
    needs: 'POST /api/label-runs',
    who: 'A storekeeper, inspector or manager',
  },
  {
    title: 'Inspect it and accept it',
    text: 'The first inspection opens the way into service.',
    to: paths.slings('state=received'),
    needs: 'POST /api/slings/:id/inspections',
    who: 'An inspector',
  },
];

/** While no sling is on the books: the way to the first one in service. */
export function FirstSteps(): ReactNode {
  const user = useUser();
  return (
    <Panel title="The first steps">
      <ol className="flex flex-col">
        {STEPS.map((step, i) => (
          <li key={step.title} className="flex gap-4 border-b border-rule py-3">
            <span
              className="grid size-9 shrink-0 place-items-center rounded-full border-2 border-ink font-bold"
              aria-hidden="true"
            >
              {i + 1}
            </span>
            <span className="min-w-0">
              {mayCall(step.needs, user.roles) ? (
                <Link
                  to={step.to}
                  className="inline-flex min-h-9 items-center font-semibold text-petrol underline underline-offset-4"
                >
                  {step.title}
                </Link>
              ) : (
                <span className="font-semibold">{step.title}</span>
              )}
              <span className="block text-muted">{step.text}</span>
              {!mayCall(step.needs, user.roles) && (
                <span className="block text-[0.9375rem] text-muted">{step.who} does this.</span>
              )}
            </span>
          </li>
        ))}
      </ol>
    </Panel>
  );
}
