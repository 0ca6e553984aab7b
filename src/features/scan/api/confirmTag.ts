import { useMutation, useQueryClient } from '@tanstack/react-query';
import { taggedSlingResponse, type ConfirmTagRequest } from '../../../../shared/schemas/labels';
import { api } from '../../../lib/apiClient';

const confirmTag = (code: string, request: ConfirmTagRequest) =>
  api.send('POST', `/tags/${encodeURIComponent(code)}/confirm`, request, taggedSlingResponse);

export function useConfirmTag(code: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: ConfirmTagRequest) => confirmTag(code, request),
    onSuccess: () =>
      Promise.all(
        ['tags', 'slings', 'label-runs'].map((queryKey) =>
          client.invalidateQueries({ queryKey: [queryKey] }),
        ),
      ),
  });
}
