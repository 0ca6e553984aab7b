import type { ReactNode } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import type { HoldReason } from '../../../shared/domain/lifecycle/reasons';
import type { Sling } from '../../../shared/schemas/slings';
import { PageHeader } from '../../components/ui/PageHeader';
import { ErrorState, SkeletonLines } from '../../components/ui/states';
import { showToast } from '../../components/ui/Toast';
import { paths } from '../../config/paths';
import { HeldConfirmation } from '../../features/actions/components/HeldConfirmation';
import { HoldForm } from '../../features/actions/components/HoldForm';
import { QuickHold } from '../../features/actions/components/QuickHold';
import { NotOpen } from '../../features/actions/components/NotOpen';
import { SlingLine } from '../../features/actions/components/SlingLine';
import { isChoosable } from '../../features/actions/holdDraft';
import { useSling } from '../../features/slings/api/getSling';
import { useLocations } from '../../lib/places';
import { useKeepSling } from '../../features/slings/hooks/useKeepSling';

/** `?more` asks for several reasons (`?reason=` arms one); `?held` shows the confirmation, also after a reload. */
export function Component(): ReactNode {
  const id = Number(useParams().id);
  const [search, setSearch] = useSearchParams();
  const query = useSling(id);
  const sling = query.data;
  const isHeldNow = search.has('held');
  const header = (
    <PageHeader
      title={isHeldNow ? 'Held' : 'Hold'}
      quiet={isHeldNow}
      back={{ to: paths.sling(id), label: sling ? `Sling ${sling.number}` : 'The sling' }}
    />
  );
  if (!sling) {
    return (
      <>
        {header}
        {query.error ? (
          <ErrorState error={query.error} onRetry={() => void query.refetch()} />
        ) : (
          <SkeletonLines lines={8} />
        )}
      </>
    );
  }
  const reason = search.get('reason');
  return (
    <>
      {header}
      <HoldSteps
        sling={sling}
        isHeldNow={isHeldNow}
        armedReason={isChoosable(reason) ? reason : null}
        isMore={search.has('more') || isChoosable(reason)}
        onMore={(code) => setSearch(code ? { more: '', reason: code } : { more: '' })}
        onHeld={() => setSearch({ held: '' }, { replace: true })}
        onReload={query.refetch}
      />
    </>
  );
}

function HoldSteps({
  sling,
  isHeldNow,
  armedReason,
  isMore,
  onMore,
  onHeld,
  onReload,
}: Pick<Parameters<typeof HoldForm>[0], 'sling' | 'armedReason'> & {
  isHeldNow: boolean;
  isMore: boolean;
  onMore: (reason: HoldReason | null) => void;
  onHeld: () => void;
  onReload: () => Promise<unknown>;
}): ReactNode {
  const { onSuccess: keep } = useKeepSling(sling.id);
  const locations = useLocations().data?.items ?? [];
  const keepThen = (next: () => void) => (answer: { sling: Sling }) => {
    void keep(answer.sling);
    next();
  };
  if (isHeldNow) {
    return (
      <HeldConfirmation
        sling={sling}
        locations={locations}
        onSecured={keepThen(() => showToast('Secured in the cage.'))}
        onPhotos={(changed) => void keep(changed)}
        onReload={onReload}
      />
    );
  }
  const answer = sling.allowedActions.find(({ action }) => action === 'hold');
  if (!answer?.open) {
    return (
      <>
        <SlingLine sling={sling} />
        <NotOpen sling={sling} action="hold" unmet={answer?.unmet ?? []} />
      </>
    );
  }
  return (
    <>
      <SlingLine sling={sling} />
      {isMore ? (
        <HoldForm sling={sling} armedReason={armedReason} onHeld={keepThen(onHeld)} />
      ) : (
        <QuickHold sling={sling} onHeld={keepThen(onHeld)} onMore={onMore} />
      )}
    </>
  );
}
