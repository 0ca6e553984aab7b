import type { ReactNode } from 'react';
import type { z } from 'zod';
import type { oneTimeLinkResponse } from '../../../../shared/schemas/people';
import type { Site } from '../../../../shared/schemas/places';
import { useCreateUser } from '../api/users';
import { NEW_USER } from '../userForm';
import { UserForm } from './UserForm';

export type MadeLink = z.infer<typeof oneTimeLinkResponse>;

export function NewUser({
  sites,
  onMade,
}: {
  sites: readonly Site[];
  onMade: (link: MadeLink) => void;
}): ReactNode {
  const create = useCreateUser();
  return (
    <UserForm
      draftKey="user-new"
      initial={{ ...NEW_USER, siteIds: sites.length === 1 ? sites.map(({ id }) => id) : [] }}
      sites={sites}
      isNew
      isSelf={false}
      problem={create.error}
      isPending={create.isPending}
      onSubmit={(values, done) =>
        create.mutate(values, {
          onSuccess: (made) => {
            done();
            onMade(made);
          },
        })
      }
    />
  );
}
