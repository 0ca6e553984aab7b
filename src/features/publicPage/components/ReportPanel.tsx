import { useState, type ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { readDraft } from '../../../lib/draft';
import { reportDraftSchema } from '../reportDraft';
import { ReportForm } from './ReportForm';

/** One large press opens the form; a report that was begun is open already. */
export function ReportPanel({
  code,
  onSent,
}: {
  code: string;
  onSent: (message: string) => void;
}): ReactNode {
  const [isOpen, setIsOpen] = useState(() => readDraft(`report.${code}`, reportDraftSchema) !== null);
  if (!isOpen) {
    return (
      <div>
        <Button tone="danger" wide className="min-h-16 text-xl" onClick={() => setIsOpen(true)}>
          Report damage
        </Button>
        <p className="mt-2 text-muted">A report takes this sling out of use at once.</p>
      </div>
    );
  }
  return (
    <section aria-labelledby="report" className="border-t-2 border-ink pt-3">
      <h2 id="report" className="mb-3 text-xl font-bold">
        Report damage
      </h2>
      <ReportForm code={code} onSent={onSent} />
    </section>
  );
}
