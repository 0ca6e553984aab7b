import type { ReactNode } from 'react';
import { useLocation, useParams } from 'react-router-dom';
import { idParam } from '../../../shared/schemas/common';
import type { Sling } from '../../../shared/schemas/slings';
import { SlingDrawing } from '../../components/sling/SlingDrawing';
import { PageHeader } from '../../components/ui/PageHeader';
import { ErrorState } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { LastLedgerRows } from '../../features/ledger/components/LastLedgerRows';
import { useSling } from '../../features/slings/api/getSling';
import { ActionsPanel } from '../../features/slings/components/record/ActionsPanel';
import { CertificatesPanel } from '../../features/slings/components/record/CertificatesPanel';
import { CorrectionPanel } from '../../features/slings/components/record/CorrectionPanel';
import { FactsPanel, FittingsPanel, LoadsPanel } from '../../features/slings/components/record/FactPanels';
import { InspectionsPanel } from '../../features/slings/components/record/InspectionsPanel';
import { LabelPanel } from '../../features/slings/components/record/LabelPanel';
import { NoSuchSling } from '../../features/slings/components/record/NoSuchSling';
import { NotesPanel } from '../../features/slings/components/record/NotesPanel';
import { PhotosPanel } from '../../features/slings/components/record/PhotosPanel';
import { RecordHead } from '../../features/slings/components/record/RecordHead';
import { RecordSkeleton } from '../../features/slings/components/record/RecordSkeleton';
import {
  RegisteredNotice,
  wasJustRegistered,
} from '../../features/slings/components/record/RegisteredNotice';
import { MayNotUsePanel, ReasonsPanel } from '../../features/slings/components/record/WhyPanels';
import { usePlaceNames } from '../../features/slings/hooks/usePlaceNames';
import { toProblem } from '../../lib/problem';

export function Component(): ReactNode {
  const id = idParam.safeParse(useParams().id ?? '');
  // The key starts drafts and dialogs anew when a scan leads from one record to the next
  return id.success ? <Loading key={id.data} id={id.data} /> : <NoSuchSling />;
}

function Loading({ id }: { id: number }): ReactNode {
  const query = useSling(id);
  if (query.data) return <Record sling={query.data} />;
  if (query.isPending) return <RecordSkeleton />;
  if (toProblem(query.error).status === 404) return <NoSuchSling />;
  return <ErrorState error={query.error} onRetry={() => void query.refetch()} />;
}

function Record({ sling }: { sling: Sling }): ReactNode {
  const places = usePlaceNames();
  const location = useLocation();
  const timeZone = places.timeZone(sling.siteId);
  const siteName = places.site(sling.siteId);
  return (
    <>
      <PageHeader
        title={`Sling ${sling.number}`}
        quiet
        back={{ to: paths.slings(), label: 'Slings' }}
        {...(siteName ? { site: siteName } : {})}
      />
      {wasJustRegistered(location.state) && <RegisteredNotice sling={sling} />}
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_21rem]">
        <div className="flex min-w-0 flex-col gap-6">
          <RecordHead sling={sling} />
          <MayNotUsePanel sling={sling} />
          <ReasonsPanel sling={sling} timeZone={timeZone} />
          <ActionsPanel sling={sling} />
        </div>
        <aside aria-label="Drawing and label" className="flex min-w-0 flex-col gap-6 lg:row-span-2">
          <div className="grid place-items-center border border-rule bg-card p-4">
            <SlingDrawing sling={sling} className="h-80 max-w-full" />
          </div>
          <LabelPanel sling={sling} />
          <PhotosPanel sling={sling} timeZone={timeZone} />
          <NotesPanel sling={sling} />
        </aside>
        <div className="flex min-w-0 flex-col gap-6">
          <LoadsPanel sling={sling} />
          <FactsPanel sling={sling} />
          <FittingsPanel sling={sling} />
          <CertificatesPanel sling={sling} />
          <InspectionsPanel slingId={sling.id} />
          <LastLedgerRows slingId={sling.id} timeZone={timeZone} locationName={places.location} />
          <CorrectionPanel sling={sling} />
        </div>
      </div>
    </>
  );
}
