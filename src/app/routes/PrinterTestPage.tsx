import type { ReactNode } from 'react';
import { mayCall } from '../../../shared/domain/access/routes';
import { Notice } from '../../components/ui/Notice';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';
import { PrinterTest } from '../../features/labels/components/PrinterTest';
import { useUser } from '../../lib/session';

export function Component(): ReactNode {
  const { roles } = useUser();
  return (
    <>
      <PageHeader
        title="Test a printer"
        back={{ to: paths.labels, label: 'Labels' }}
        sub="Finds the smallest code that a printer can do."
      />
      {mayCall('GET /api/label-stocks/:id/test-page', roles) ? (
        <PrinterTest />
      ) : (
        <Notice title="Not part of your roles">
          Storekeepers, inspectors and managers print test pages.
        </Notice>
      )}
    </>
  );
}
