import { useQueryClient } from '@tanstack/react-query';
import type { Sling } from '../../../../shared/schemas/slings';
import { slingKeys } from '../api/slingKeys';

/** What every change of a record does with its answer: the record is the answer, lists and ledger are asked for anew. */
export function useKeepSling(id: number): {
  onSuccess: (sling: Sling) => Promise<unknown>;
  onError: () => void;
} {
  const client = useQueryClient();
  return {
    onSuccess: (sling) => {
      client.setQueryData(slingKeys.record(id), sling);
      return Promise.all([
        client.invalidateQueries({ queryKey: ['slings', 'list'], refetchType: 'none' }),
        client.invalidateQueries({ queryKey: ['ledger', id] }),
      ]);
    },
    // A refused change may mean that somebody else was faster: show what is true now
    onError: () => void client.invalidateQueries({ queryKey: slingKeys.record(id), exact: true }),
  };
}
