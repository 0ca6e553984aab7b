import { useId, useRef, useState, type ReactNode } from 'react';
import { fileUrl } from '../../config/paths';
import { toProblem } from '../../lib/problem';
import { uploadFile } from '../../lib/uploadFile';
import { Button } from './Button';
import { FieldError } from './Field';

export interface FilePickerProps {
  label: string;
  hint?: ReactNode;
  error?: string | undefined;
  /** Id of the stored file, or null. */
  value: string | null;
  onChange: (id: string | null) => void;
}

/** One paper: a PDF or a picture of it, up to 10 MB. */
export function FilePicker({ label, hint, error, value, onChange }: FilePickerProps): ReactNode {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [share, setShare] = useState<number | null>(null);
  const [failure, setFailure] = useState<string | undefined>();

  async function send(file: File): Promise<void> {
    setFailure(undefined);
    setShare(0);
    try {
      const stored = await uploadFile(file, { onProgress: setShare });
      onChange(stored.id);
    } catch (thrown) {
      const problem = toProblem(thrown);
      setFailure(`${file.name} was not sent. ${problem.detail || problem.title}`);
    } finally {
      setShare(null);
    }
  }

  return (
    <div role="group" aria-labelledby={`${id}-label`} className="flex flex-col gap-2">
      <div>
        <p id={`${id}-label`} className="font-semibold">
          {label}
        </p>
        {hint && <p className="text-[0.9375rem] text-muted">{hint}</p>}
      </div>
      <div className="flex flex-wrap items-center gap-3">
        {share !== null && (
          <progress
            value={share}
            max={1}
            aria-label={`Sending ${label}`}
            className="h-12 w-40 accent-petrol"
          />
        )}
        {value && (
          <a
            href={fileUrl(value)}
            target="_blank"
            rel="noreferrer"
            className="flex min-h-target items-center font-semibold text-petrol underline underline-offset-4"
          >
            Open the file
          </a>
        )}
        <Button tone="quiet" disabled={share !== null} onClick={() => input.current?.click()}>
          {value ? 'Choose another' : 'Choose a file'}
        </Button>
        {value && (
          <Button tone="plain" onClick={() => onChange(null)}>
            Leave out
          </Button>
        )}
      </div>
      <input
        ref={input}
        type="file"
        tabIndex={-1}
        aria-label={label}
        accept="application/pdf,image/jpeg,image/png,image/webp"
        className="sr-only"
        onChange={(event) => {
          const file = event.target.files?.[0];
          event.target.value = '';
          if (file) void send(file);
        }}
      />
      <FieldError id={`${id}-error`} message={failure ?? error} />
    </div>
  );
}
