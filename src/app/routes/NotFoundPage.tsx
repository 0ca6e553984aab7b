import type { ReactNode } from 'react';
import { LinkButton } from '../../components/ui/Button';
import { EmptyState } from '../../components/ui/states';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';

export function Component(): ReactNode {
  return (
    <>
      <PageHeader title="No such page" />
      <EmptyState
        title="This address leads nowhere"
        action={
          <div className="flex flex-wrap gap-3">
            <LinkButton to={paths.slings()}>Look in the register</LinkButton>
            <LinkButton to={paths.scan()} tone="quiet">
              Scan a label
            </LinkButton>
          </div>
        }
      >
        It may be mistyped. Search for the sling by its number, serial or tag code, or scan its label.
      </EmptyState>
    </>
  );
}
