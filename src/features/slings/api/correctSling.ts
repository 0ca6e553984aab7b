import { useMutation } from '@tanstack/react-query';
import type { CorrectionRequest } from '../../../../shared/schemas/corrections';
import { slingSchema, type Sling } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { useKeepSling } from '../hooks/useKeepSling';

/** Changes identity or rating, by an inspector with evidence; may hold the sling. */
export function useCorrectSling(sling: Pick<Sling, 'id' | 'version'>) {
  return useMutation({
    mutationFn: (body: CorrectionRequest) =>
      api.send('POST', `/slings/${sling.id}/corrections`, body, slingSchema, { ifMatch: sling.version }),
    ...useKeepSling(sling.id),
  });
}
