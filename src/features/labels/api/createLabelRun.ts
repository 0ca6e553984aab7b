import { useMutation, useQueryClient } from '@tanstack/react-query';
import { labelRunSchema, type CreateLabelRunRequest } from '../../../../shared/schemas/labels';
import { api } from '../../../lib/apiClient';
import { labelKeys } from './labelKeys';

const createLabelRun = (request: CreateLabelRunRequest) =>
  api.send('POST', '/label-runs', request, labelRunSchema);

export function useCreateLabelRun() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: createLabelRun,
    onSuccess: (run) => {
      client.setQueryData(labelKeys.run(run.id), run);
      return client.invalidateQueries({ queryKey: ['slings'] });
    },
  });
}
