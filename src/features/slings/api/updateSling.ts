import { useMutation } from '@tanstack/react-query';
import { slingSchema, type Sling, type UpdateSlingRequest } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { useKeepSling } from '../hooks/useKeepSling';

/** Changes what isn't identity or rating: notes, home location, cost, photos to add. */
export function useUpdateSling(sling: Pick<Sling, 'id' | 'version'>) {
  return useMutation({
    mutationFn: (body: UpdateSlingRequest) =>
      api.send('PATCH', `/slings/${sling.id}`, body, slingSchema, { ifMatch: sling.version }),
    ...useKeepSling(sling.id),
  });
}
