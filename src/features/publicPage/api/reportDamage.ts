import { useMutation } from '@tanstack/react-query';
import { damageReportResponse, type DamageReportRequest } from '../../../../shared/schemas/publicPage';
import { api } from '../../../lib/apiClient';
import { useRetryKey } from '../../../lib/useRetryKey';

/** Tells the store what was seen; it holds the sling. */
export function useReportDamage(code: string) {
  const retryKey = useRetryKey();
  return useMutation({
    mutationFn: (body: DamageReportRequest) =>
      api.send('POST', `/public/tags/${encodeURIComponent(code)}/reports`, body, damageReportResponse, {
        idempotencyKey: retryKey.take(body),
      }),
    onSettled: (_, error) => retryKey.settle(error),
  });
}
