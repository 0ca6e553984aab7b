import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useParams } from 'react-router-dom';
import { mayCall } from '../../../shared/domain/access/routes';
import { PageHeader } from '../../components/ui/PageHeader';
import { ErrorState, SkeletonLines } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { labelRunQuery } from '../../features/labels/api/getLabelRun';
import { LabelRunView } from '../../features/labels/components/LabelRunView';
import { formatCount, formatDateTime } from '../../lib/format';
import { useUser } from '../../lib/session';

export function Component(): ReactNode {
  const runId = Number(useParams().runId);
  const { roles } = useUser();
  const { data: run, error, refetch } = useQuery(labelRunQuery(runId));
  return (
    <>
      <PageHeader
        title={`Label run ${runId}`}
        back={{ to: paths.labels, label: 'Labels' }}
        sub={
          run &&
          `${formatCount(run.tags.length, 'label')}, made ${formatDateTime(run.createdAt)} by ${run.createdBy}`
        }
      />
      {run ? (
        <LabelRunView run={run} mayPrint={mayCall('POST /api/label-runs', roles)} />
      ) : error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <SkeletonLines lines={8} />
      )}
    </>
  );
}
