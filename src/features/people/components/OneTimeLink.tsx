import { useRef, useState, type ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { Panel } from '../../../components/ui/Panel';
import { formatDateTime } from '../../../lib/format';

export interface OneTimeLinkProps {
  name: string;
  link: string;
  expiresAt: string;
  onDone: () => void;
}

/** The link that sets a password: shown once and kept nowhere. */
export function OneTimeLink({ name, link, expiresAt, onDone }: OneTimeLinkProps): ReactNode {
  const field = useRef<HTMLDivElement>(null);
  const [copied, setCopied] = useState<'no' | 'yes' | 'by_hand'>('no');

  const handleCopy = async (): Promise<void> => {
    try {
      await navigator.clipboard.writeText(link);
      setCopied('yes');
    } catch {
      // Over plain http browsers keep the clipboard shut: the text is marked, so that one shortcut is left
      field.current?.querySelector('input')?.select();
      setCopied('by_hand');
    }
  };

  return (
    <Panel card title={`Link for ${name}`} className="mb-8">
      <p className="mb-3 max-w-prose">
        Give it to {name} yourself, over a way that you trust. It sets the password, works once, until{' '}
        {formatDateTime(expiresAt)}, and is shown only now: if it gets lost, make a new one.
      </p>
      <div ref={field}>
        <TextField
          label="One-time link"
          mono
          readOnly
          value={link}
          onFocus={(event) => event.target.select()}
        />
      </div>
      <p role="status" className="min-h-6 py-1 font-medium">
        {copied === 'yes' && 'Copied.'}
        {copied === 'by_hand' && 'The link is marked: copy it with Ctrl C, or hold it down on a phone.'}
      </p>
      <div className="flex flex-wrap gap-3">
        <Button onClick={() => void handleCopy()}>Copy the link</Button>
        <Button tone="quiet" onClick={onDone}>
          I have passed it on
        </Button>
      </div>
    </Panel>
  );
}
