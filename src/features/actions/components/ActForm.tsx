import type { ReactNode } from 'react';
import type { SlingAction } from '../../../../shared/domain/lifecycle/actions';
import { LinkButton } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { paths } from '../../../config/paths';
import { DONE_ELSEWHERE } from '../unmetSteps';
import type { ActFormProps } from '../actFormProps';
import { DepartForm } from './DepartForm';
import { DestroyForm } from './DestroyForm';
import { FoundForm } from './FoundForm';
import { NotOpen } from './NotOpen';
import { NoteForm } from './NoteForm';
import { PlaceForm } from './PlaceForm';
import { ReleaseForm } from './ReleaseForm';

/** The form of one action, or why there is none for this person on this sling now. */
export function ActForm({ action, ...props }: ActFormProps & { action: SlingAction }): ReactNode {
  const { sling } = props;
  const answer = sling.allowedActions.find((each) => each.action === action);
  const elsewhere = DONE_ELSEWHERE[action];
  const unmet = answer?.unmet ?? [];
  if (elsewhere && !unmet.some(({ rule }) => rule === 'state' || rule === 'role')) {
    return (
      <Notice
        tone="info"
        title="Not done on this page"
        action={
          <LinkButton to={paths.sling(sling.id)} tone="quiet">
            Back to the sling
          </LinkButton>
        }
      >
        {elsewhere}
      </Notice>
    );
  }
  if (!answer?.open) return <NotOpen sling={sling} action={action} unmet={unmet} />;
  switch (action) {
    case 'accept':
    case 'return_to_service':
      return <NoteForm {...props} action={action} label="Note" isRequired={false} />;
    case 'condemn':
      return (
        <NoteForm
          {...props}
          action={action}
          label="Why it is condemned"
          isRequired
          tone="danger"
          hint="What was found, and why neither evaluation nor repair is worth it."
        />
      );
    case 'report_lost':
      return (
        <NoteForm
          {...props}
          action={action}
          label="What is known"
          isRequired
          tone="danger"
          hint="Where it was seen last, by whom, and where you looked."
        />
      );
    case 'secure':
    case 'receive_back':
      return <PlaceForm {...props} action={action} />;
    case 'found':
      return <FoundForm {...props} />;
    case 'release':
      return <ReleaseForm {...props} />;
    case 'destroy':
      return <DestroyForm {...props} />;
    case 'depart':
      return <DepartForm {...props} />;
    case 'hold':
      return (
        <LinkButton to={paths.hold(sling.id)} tone="danger">
          Go to the hold page
        </LinkButton>
      );
    case 'send':
    case 'destroyed_by_evaluator':
    case 'withdraw_as_error':
      return null;
  }
}
