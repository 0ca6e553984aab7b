import { useMutation, useQueryClient } from '@tanstack/react-query';
import { slingSchema, type CreateSlingRequest, type Sling } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { useRetryKey } from '../../../lib/useRetryKey';
import { slingKeys } from './slingKeys';

/** Puts a sling on the books. */
export function useCreateSling() {
  const client = useQueryClient();
  const retryKey = useRetryKey();
  return useMutation({
    mutationFn: (body: CreateSlingRequest): Promise<Sling> =>
      api.send('POST', '/slings', body, slingSchema, { idempotencyKey: retryKey.take(body) }),
    onSettled: (_, error) => retryKey.settle(error),
    onSuccess: (sling) => {
      client.setQueryData(slingKeys.record(sling.id), sling);
      return client.invalidateQueries({ queryKey: slingKeys.all, refetchType: 'none' });
    },
  });
}
