import type { ReactNode } from 'react';
import { LinkButton } from '../../../../components/ui/Button';
import { PageHeader } from '../../../../components/ui/PageHeader';
import { EmptyState } from '../../../../components/ui/states';
import { paths } from '../../../../config/paths';

/** For an address that leads to no sling, or to one of a site where the person doesn't work. */
export function NoSuchSling(): ReactNode {
  return (
    <>
      <PageHeader title="Sling not found" back={{ to: paths.slings(), label: 'Slings' }} />
      <EmptyState
        title="No sling here"
        action={
          <span className="flex flex-wrap gap-3">
            <LinkButton to={paths.scan()}>Scan its label</LinkButton>
            <LinkButton to={paths.slings()} tone="quiet">
              Search the register
            </LinkButton>
          </span>
        }
      >
        The address may be mistyped, or the sling belongs to a site where you do not work.
      </EmptyState>
    </>
  );
}
