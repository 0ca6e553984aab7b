import { useMutation } from '@tanstack/react-query';
import { slingSchema, type CertificateInput, type Sling } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { useKeepSling } from '../hooks/useKeepSling';

/** Puts one more certificate on the sling's file. */
export function useAddCertificate(sling: Pick<Sling, 'id' | 'version'>) {
  return useMutation({
    mutationFn: (body: CertificateInput) =>
      api.send('POST', `/slings/${sling.id}/certificates`, body, slingSchema, { ifMatch: sling.version }),
    ...useKeepSling(sling.id),
  });
}
