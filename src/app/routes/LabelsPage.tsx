import type { ReactNode } from 'react';
import { mayCall } from '../../../shared/domain/access/routes';
import { LinkButton } from '../../components/ui/Button';
import { Notice } from '../../components/ui/Notice';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';
import { LabelRunForm } from '../../features/labels/components/LabelRunForm';
import { readLastRun } from '../../features/labels/labelMemory';
import { useUser } from '../../lib/session';

export function Component(): ReactNode {
  const { roles } = useUser();
  const lastRun = readLastRun();
  return (
    <>
      <PageHeader
        title="Print labels"
        sub="Our label carries the scan; it never replaces the maker’s tag."
        actions={
          <>
            {lastRun && (
              <LinkButton tone="quiet" to={paths.labelRun(lastRun)}>
                Last run
              </LinkButton>
            )}
            <LinkButton tone="quiet" to={paths.printerTest}>
              Test a printer
            </LinkButton>
          </>
        }
      />
      {mayCall('POST /api/label-runs', roles) ? (
        <LabelRunForm />
      ) : (
        <Notice title="Not part of your roles">
          Storekeepers, inspectors and managers print labels. Which label is on a sling stands in its record.
        </Notice>
      )}
    </>
  );
}
