import type { ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import { PageHeader } from '../../components/ui/PageHeader';
import { ScanStation } from '../../features/scan/components/ScanStation';

export function Component(): ReactNode {
  const [query] = useSearchParams();
  return (
    <>
      <PageHeader title="Scan" quiet />
      <ScanStation addressCode={query.get('code')} />
    </>
  );
}
