import { useMutation } from '@tanstack/react-query';
import { slingSchema, type Sling } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';

/** Adds photos to the record. No version: a photo takes nothing away from what anybody else did meanwhile. */
export function useAddPhotos(slingId: number) {
  return useMutation({
    mutationFn: (photoIds: string[]): Promise<Sling> =>
      api.send('PATCH', `/slings/${slingId}`, { photoIds }, slingSchema),
  });
}
