import type { ReactNode } from 'react';
import type { ActionResponse } from '../../../../shared/schemas/actions';
import type { Location } from '../../../../shared/schemas/places';
import type { Sling } from '../../../../shared/schemas/slings';
import { Notice } from '../../../components/ui/Notice';
import { useAct } from '../api/actOnSling';
import { ActProblem } from './ActProblem';

export interface CageButtonsProps {
  sling: Sling;
  locations: readonly Location[];
  onDone: (answer: ActionResponse) => void;
  onReload: () => Promise<unknown>;
}

/** The cages of the site where the sling is; one tap says that it lies in that one. */
export function CageButtons({ sling, locations, onDone, onReload }: CageButtonsProps): ReactNode {
  const act = useAct(sling, 'secure');
  const cages = locations.filter(({ siteId, purpose }) => siteId === sling.siteId && purpose === 'cage');
  if (cages.length === 0) {
    return (
      <Notice tone="warn" title="No cage is on the books for this site">
        Lock the sling away where nobody takes it by mistake. An administrator adds the cage to the places of
        this site; then say here that it lies in it.
      </Notice>
    );
  }
  return (
    <div className="flex flex-col gap-3">
      <ul className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
        {cages.map((cage) => {
          const isPending = act.isPending && act.variables.locationId === cage.id;
          const isThere = sling.custody.kind === 'cage' && sling.custody.locationId === cage.id;
          return (
            <li key={cage.id}>
              <button
                type="button"
                disabled={act.isPending}
                aria-busy={isPending || undefined}
                onClick={() => act.mutate({ locationId: cage.id }, { onSuccess: onDone })}
                className="flex min-h-18 w-full items-center gap-3.5 rounded border-2 border-petrol bg-card px-4 py-3 text-left text-lg leading-tight font-semibold text-petrol hover:bg-petrol-wash disabled:opacity-60"
              >
                <CageDrawing />
                <span>
                  {cage.name}
                  <span className="block text-base font-normal text-ink">
                    {isPending ? 'Being recorded' : isThere ? 'It is in here' : 'It is in this cage now'}
                  </span>
                </span>
              </button>
            </li>
          );
        })}
      </ul>
      <ActProblem problem={act.error} onReload={onReload} onDismiss={act.reset} />
    </div>
  );
}

function CageDrawing(): ReactNode {
  return (
    <svg viewBox="0 0 44 44" className="size-11 shrink-0" aria-hidden="true">
      <path
        d="M6 39V13L22 5l16 8v26ZM14 9.500V39M30 9.500V39M22 5v34M6 22h32"
        fill="none"
        stroke="currentColor"
        strokeWidth="2.500"
        strokeLinejoin="round"
      />
      <rect x="18" y="24" width="8" height="7" rx="1.500" fill="currentColor" />
    </svg>
  );
}
