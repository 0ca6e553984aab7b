import type { ReactNode } from 'react';
import { z } from 'zod';
import type { Sling } from '../../../../../shared/schemas/slings';
import { LinkButton } from '../../../../components/ui/Button';
import { Notice } from '../../../../components/ui/Notice';
import { paths } from '../../../../config/paths';

const registeredState = z.object({ registered: z.literal(true) });

export const wasJustRegistered = (state: unknown): boolean => registeredState.safeParse(state).success;

/** Right after registration: what comes next. */
export function RegisteredNotice({ sling }: { sling: Sling }): ReactNode {
  if (sling.tag !== null) return null;
  return (
    <Notice
      tone="good"
      className="mb-4"
      title={`${sling.number} is on the books`}
      action={
        <span className="flex flex-wrap gap-3">
          <LinkButton to={paths.newSling} tone="quiet">
            Register another
          </LinkButton>
          <LinkButton to={paths.labelsFor([sling.id])}>Print its label</LinkButton>
        </span>
      }
    >
      Next: print its label, fix it to the sling and confirm it by a scan. Then comes the first inspection.
    </Notice>
  );
}
