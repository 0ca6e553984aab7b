import type { ReactNode } from 'react';
import type { User } from '../../../../shared/schemas/people';
import type { Site } from '../../../../shared/schemas/places';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { showToast } from '../../../components/ui/Toast';
import { getToday } from '../../../lib/format';
import { useMakeLink, useUpdateUser } from '../api/users';
import { toFormValues } from '../userForm';
import type { MadeLink } from './NewUser';
import { UserForm } from './UserForm';
import { describeAccount } from './UserList';

export function EditUser({
  user,
  sites,
  isSelf,
  onSaved,
  onLink,
}: {
  user: User;
  sites: readonly Site[];
  isSelf: boolean;
  onSaved: () => void;
  onLink: (link: MadeLink) => void;
}): ReactNode {
  const update = useUpdateUser(user.id);
  const makeLink = useMakeLink();
  return (
    <>
      <Panel title="Account" className="mb-8">
        <div className="flex flex-wrap items-center justify-between gap-3">
          <p>{describeAccount(user, getToday())}</p>
          <Button
            tone="quiet"
            pending={makeLink.isPending}
            pendingText="Making the link"
            onClick={() => makeLink.mutate(user.id, { onSuccess: onLink })}
          >
            {user.hasPassword ? 'Link to set a new password' : 'New invitation link'}
          </Button>
        </div>
        <p className="text-[0.9375rem] text-muted">
          Earlier links of this account stop working. To close the account, let it end on a day gone by; its
          acts stay on record.
        </p>
        <ProblemNotice problem={makeLink.error} className="mt-3" />
      </Panel>
      <UserForm
        draftKey={`user-${user.id}`}
        initial={toFormValues(user)}
        sites={sites}
        isNew={false}
        isSelf={isSelf}
        problem={update.error}
        isPending={update.isPending}
        onSubmit={({ email: _fixed, ...values }, done) =>
          update.mutate(values, {
            onSuccess: () => {
              done();
              showToast(`${values.name} saved`);
              onSaved();
            },
          })
        }
      />
    </>
  );
}
