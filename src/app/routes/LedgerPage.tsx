import type { ReactNode } from 'react';
import { useParams } from 'react-router-dom';
import { idParam } from '../../../shared/schemas/common';
import { PageHeader } from '../../components/ui/PageHeader';
import { ErrorState } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { LedgerPageBody } from '../../features/ledger/components/LedgerPageBody';
import { useSling } from '../../features/slings/api/getSling';
import { NoSuchSling } from '../../features/slings/components/record/NoSuchSling';
import { usePlaceNames } from '../../features/slings/hooks/usePlaceNames';

export function Component(): ReactNode {
  const id = idParam.safeParse(useParams().id ?? '');
  return id.success ? <Ledger slingId={id.data} /> : <NoSuchSling />;
}

function Ledger({ slingId }: { slingId: number }): ReactNode {
  const sling = useSling(slingId);
  const places = usePlaceNames();
  if (sling.error && !sling.data) {
    return <ErrorState error={sling.error} onRetry={() => void sling.refetch()} />;
  }
  const timeZone = sling.data && places.timeZone(sling.data.siteId);
  return (
    <>
      <PageHeader
        title={sling.data ? `Ledger of ${sling.data.number}` : 'Ledger'}
        back={{ to: paths.sling(slingId), label: sling.data?.number ?? 'Sling' }}
        sub={`Each row is chained to the one before. ${timeZone ? `Times in ${timeZone}.` : ''}`}
      />
      <LedgerPageBody slingId={slingId} timeZone={timeZone} locationName={places.location} />
    </>
  );
}
