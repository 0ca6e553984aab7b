import { useMutation } from '@tanstack/react-query';
import {
  createInspectionResponse,
  type CreateInspectionRequest,
  type CreateInspectionResponse,
} from '../../../../shared/schemas/inspection';
import { api } from '../../../lib/apiClient';
import { useRetryKey } from '../../../lib/useRetryKey';

/** Records one inspection; the server makes the verdict, and a reject or refer holds the sling with it. */
export function useCreateInspection(slingId: number) {
  const retryKey = useRetryKey();
  return useMutation({
    mutationFn: (body: CreateInspectionRequest): Promise<CreateInspectionResponse> =>
      api.send('POST', `/slings/${slingId}/inspections`, body, createInspectionResponse, {
        idempotencyKey: retryKey.take(body),
      }),
    onSettled: (_, error) => retryKey.settle(error),
  });
}
