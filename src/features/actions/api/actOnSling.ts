import { useMutation } from '@tanstack/react-query';
import type { SlingAction } from '../../../../shared/domain/lifecycle/actions';
import { actionResponse, type ActionBodies, type ActionResponse } from '../../../../shared/schemas/actions';
import type { Sling } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { useRetryKey } from '../../../lib/useRetryKey';

/** One action of the lifecycle table on one sling, guarded by the version that the person was shown. */
export function useAct<A extends SlingAction>(sling: Pick<Sling, 'id' | 'version'>, action: A) {
  const retryKey = useRetryKey();
  return useMutation({
    mutationFn: (body: ActionBodies[A]): Promise<ActionResponse> =>
      api.send('POST', `/slings/${sling.id}/actions/${action}`, body, actionResponse, {
        // Removing from service is never refused for being late: concurrent holds all count
        ifMatch: action === 'hold' ? undefined : sling.version,
        idempotencyKey: retryKey.take(body),
      }),
    onSettled: (_, error) => retryKey.settle(error),
  });
}
