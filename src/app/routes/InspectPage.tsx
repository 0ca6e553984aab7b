import type { ReactNode } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { mayCall } from '../../../shared/domain/access/routes';
import { STATE_FACTS } from '../../../shared/domain/lifecycle/states';
import type { CreateInspectionResponse } from '../../../shared/schemas/inspection';
import type { Sling } from '../../../shared/schemas/slings';
import { LinkButton } from '../../components/ui/Button';
import { PageHeader } from '../../components/ui/PageHeader';
import { EmptyState, ErrorState, SkeletonLines } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { AfterInspection } from '../../features/actions/components/AfterInspection';
import { SlingLine } from '../../features/actions/components/SlingLine';
import { useCriteria } from '../../features/inspections/api/getCriteria';
import { InspectForm } from '../../features/inspections/components/InspectForm';
import { InspectionResult } from '../../features/inspections/components/InspectionResult';
import { TypeTabs } from '../../features/inspections/components/TypeTabs';
import { listTypes } from '../../features/inspections/inspectionTypes';
import { useSling } from '../../features/slings/api/getSling';
import { useInspections } from '../../features/slings/api/listInspections';
import { useLocations, useSites } from '../../lib/places';
import { useKeepSling } from '../../features/slings/hooks/useKeepSling';
import { useToday } from '../../features/slings/hooks/useToday';
import { useUser } from '../../lib/session';

/** `?recorded=` shows the inspection that was just made, also after a reload; else one is made, of `?type=`. */
export function Component(): ReactNode {
  const id = Number(useParams().id);
  const [search, setSearch] = useSearchParams();
  const query = useSling(id);
  const sling = query.data;
  const recorded = search.get('recorded');
  return (
    <div className="max-w-4xl">
      <PageHeader
        title={recorded ? 'Inspection recorded' : 'Inspect'}
        back={{ to: paths.sling(id), label: sling ? `Sling ${sling.number}` : 'The sling' }}
      />
      {sling ? (
        <>
          <SlingLine sling={sling} />
          {recorded ? (
            <Result inspectionId={Number(recorded)} sling={sling} onReload={query.refetch} />
          ) : (
            <Examination
              sling={sling}
              onDone={({ inspection }) => setSearch({ recorded: String(inspection.id) }, { replace: true })}
            />
          )}
        </>
      ) : query.error ? (
        <ErrorState error={query.error} onRetry={() => void query.refetch()} />
      ) : (
        <SkeletonLines lines={10} />
      )}
    </div>
  );
}

function Examination({
  sling,
  onDone,
}: {
  sling: Sling;
  onDone: (answer: CreateInspectionResponse) => void;
}): ReactNode {
  const { roles } = useUser();
  const [search] = useSearchParams();
  const criteria = useCriteria(sling);
  const sites = useSites();
  const today = useToday(sling.siteId);
  const { onSuccess: keep } = useKeepSling(sling.id);
  const types = listTypes(sling);
  const type = types.find((each) => each === search.get('type')) ?? types[0];
  if (!type) return <NothingToInspect sling={sling} />;
  if (!mayCall('POST /api/slings/:id/inspections', roles)) return <NotAnInspector sling={sling} />;
  const site = sites.data?.items.find(({ id }) => id === sling.siteId);
  const error = criteria.error ?? sites.error;
  if (error) {
    const retry = (): void => void Promise.all([criteria.refetch(), sites.refetch()]);
    return <ErrorState error={error} onRetry={retry} />;
  }
  if (!criteria.data || !site) return <SkeletonLines lines={10} />;
  return (
    <>
      <TypeTabs types={types} current={type} />
      <InspectForm
        key={type}
        sling={sling}
        type={type}
        rows={criteria.data.items}
        ruleSets={site.ruleSets}
        today={today}
        onDone={(answer) => {
          void keep(answer.sling);
          onDone(answer);
          window.scrollTo({ top: 0 });
        }}
      />
    </>
  );
}

/** The verdict stays as it was given; the sling below it is the one of now, also after it went to the cage. */
function Result({
  inspectionId,
  sling,
  onReload,
}: {
  inspectionId: number;
  sling: Sling;
  onReload: () => Promise<unknown>;
}): ReactNode {
  const inspections = useInspections(sling.id);
  const { onSuccess: keep } = useKeepSling(sling.id);
  const locations = useLocations().data?.items ?? [];
  const inspection = inspections.data?.items.find(({ id }) => id === inspectionId);
  if (!inspection) {
    if (inspections.error)
      return <ErrorState error={inspections.error} onRetry={() => void inspections.refetch()} />;
    return inspections.isFetching ? <SkeletonLines lines={6} /> : <NotOfThisSling sling={sling} />;
  }
  return (
    <InspectionResult
      answer={{ inspection, sling }}
      next={
        <AfterInspection
          sling={sling}
          verdict={inspection.verdict}
          locations={locations}
          onReload={onReload}
          onDone={({ sling: secured }) => void keep(secured)}
        />
      }
    />
  );
}

function NotAnInspector({ sling }: { sling: Sling }): ReactNode {
  const canHold = sling.allowedActions.some(({ action, open }) => action === 'hold' && open);
  return (
    <EmptyState
      title="An inspector does this"
      action={
        <LinkButton to={canHold ? paths.hold(sling.id) : paths.sling(sling.id)}>
          {canHold ? 'Hold it instead' : 'Back to the sling'}
        </LinkButton>
      }
    >
      Inspections are made by a person with the role inspector. If you see damage, hold the sling: an
      inspector looks at it then.
    </EmptyState>
  );
}

function NotOfThisSling({ sling }: { sling: Sling }): ReactNode {
  return (
    <EmptyState
      title="No such inspection of this sling"
      action={<LinkButton to={paths.sling(sling.id)}>Back to the sling</LinkButton>}
    >
      The record lists every inspection that was made.
    </EmptyState>
  );
}

function NothingToInspect({ sling }: { sling: Sling }): ReactNode {
  return (
    <EmptyState
      title={`Nothing to inspect: it is ${STATE_FACTS[sling.state].word.toLowerCase()}`}
      action={<LinkButton to={paths.sling(sling.id)}>Back to the sling</LinkButton>}
    >
      {STATE_FACTS[sling.state].meaning}
    </EmptyState>
  );
}
