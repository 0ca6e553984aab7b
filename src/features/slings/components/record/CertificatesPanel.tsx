import { useState, type ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import { needsCertificate } from '../../../../../shared/domain/slings/certificates';
import { CERTIFICATE_BASIS_NAMES } from '../../../../../shared/domain/slings/kinds';
import type { Sling } from '../../../../../shared/schemas/slings';
import { Button } from '../../../../components/ui/Button';
import { Panel } from '../../../../components/ui/Panel';
import { fileUrl } from '../../../../config/paths';
import { formatDate } from '../../../../lib/format';
import { useUnits, useUser } from '../../../../lib/session';
import { CertificateDialog } from './CertificateDialog';

/** Certificates on file, newest first, and the way to add one. */
export function CertificatesPanel({ sling }: { sling: Sling }): ReactNode {
  const user = useUser();
  const { formatLoad } = useUnits();
  const [isAdding, setIsAdding] = useState(false);
  return (
    <Panel title="Certificates">
      {sling.certificates.length === 0 && (
        <p className={needsCertificate(sling) ? 'font-medium text-danger' : 'text-muted'}>
          {needsCertificate(sling)
            ? 'None on file. It is accepted into service only with one.'
            : 'None on file. None is asked for with this sling.'}
        </p>
      )}
      <ul>
        {sling.certificates
          .toSorted((a, b) => b.addedAt.localeCompare(a.addedAt))
          .map((certificate) => (
            <li
              key={certificate.id}
              className="flex items-center justify-between gap-4 border-b border-rule py-2"
            >
              <span className="min-w-0">
                <span className="font-medium break-words">{certificate.number}</span>
                <span className="block text-[0.9375rem] text-muted">
                  {CERTIFICATE_BASIS_NAMES[certificate.basis]}, {formatDate(certificate.testedOn)}
                  {certificate.loadKg !== undefined && `, at ${formatLoad(certificate.loadKg)}`}
                </span>
              </span>
              {certificate.fileId && (
                <a
                  href={fileUrl(certificate.fileId)}
                  target="_blank"
                  rel="noreferrer"
                  className="flex min-h-target items-center px-2 font-semibold text-petrol underline underline-offset-4"
                >
                  Open<span className="sr-only"> certificate {certificate.number}</span>
                </a>
              )}
            </li>
          ))}
      </ul>
      {mayCall('POST /api/slings/:id/certificates', user.roles) && (
        <Button tone="quiet" className="no-print mt-3" onClick={() => setIsAdding(true)}>
          Add a certificate
        </Button>
      )}
      <CertificateDialog sling={sling} isOpen={isAdding} onClose={() => setIsAdding(false)} />
    </Panel>
  );
}
