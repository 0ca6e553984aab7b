import { useMutation } from '@tanstack/react-query';
import { verifyResponse, type VerifyResponse } from '../../../../shared/schemas/ledger';
import { api } from '../../../lib/apiClient';

/** Has the server compute one sling's chain anew; asked for by a press, so a mutation in manner though it changes nothing. */
export const useVerifyLedger = (slingId: number) =>
  useMutation({
    mutationFn: (): Promise<VerifyResponse> => api.get(`/ledger/verify?slingId=${slingId}`, verifyResponse),
  });
