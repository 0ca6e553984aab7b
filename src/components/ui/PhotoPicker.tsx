import { useId, useRef, type ReactNode } from 'react';
import { fileUrl } from '../../config/paths';
import { Button } from './Button';
import { FieldError } from './Field';
import { usePhotoUploads, type PendingPhotoEntry, type PhotoUploadProps } from './usePhotoUploads';

export interface PhotoPickerProps extends PhotoUploadProps {
  label: string;
  hint?: ReactNode;
  error?: string | undefined;
}

/** Photos from the camera or the gallery, sent as they are taken. Never demands one. */
export function PhotoPicker(props: PhotoPickerProps): ReactNode {
  const { label, hint, error, value, max = 12 } = props;
  const id = useId();
  const { pending, previews, add, retry, drop, remove } = usePhotoUploads(props);
  const isFull = value.length + pending.length >= max;
  return (
    <div role="group" aria-labelledby={`${id}-label`} className="flex flex-col gap-2">
      <div>
        <p id={`${id}-label`} className="font-semibold">
          {label}
        </p>
        {hint && <p className="text-[0.9375rem] text-muted">{hint}</p>}
      </div>
      {(value.length > 0 || pending.length > 0) && (
        <ul className="grid grid-cols-3 gap-2.5 sm:grid-cols-4">
          {value.map((photoId, i) => (
            <li key={photoId} className="relative">
              <img
                src={previews.get(photoId) ?? fileUrl(photoId)}
                alt={`Photo ${i + 1}`}
                className="aspect-square w-full rounded border border-rule object-cover"
              />
              <RemoveButton label={`Remove photo ${i + 1}`} onClick={() => remove(photoId)} />
            </li>
          ))}
          {pending.map((p) => (
            <PendingPhoto key={p.key} entry={p} onRetry={() => retry(p)} onDrop={() => drop(p.key)} />
          ))}
        </ul>
      )}
      {isFull ? (
        <p className="text-[0.9375rem] text-muted">{max} photos are the most for one act.</p>
      ) : (
        <div className="flex flex-wrap gap-2.5">
          <FileButton text="Take a photo" isCamera onFiles={add} />
          <FileButton text="From the gallery" onFiles={add} />
        </div>
      )}
      <FieldError id={`${id}-error`} message={error} />
    </div>
  );
}

function PendingPhoto({
  entry,
  onRetry,
  onDrop,
}: {
  entry: PendingPhotoEntry;
  onRetry: () => void;
  onDrop: () => void;
}): ReactNode {
  if (entry.failed !== null) {
    return (
      <li className="relative col-span-full flex flex-wrap items-center justify-between gap-3 border border-danger bg-danger-wash px-3 py-2">
        <p role="alert" className="min-w-0 flex-1 basis-48">
          <span className="font-semibold break-all">{entry.file.name}</span>: not sent. {entry.failed}
        </p>
        <span className="flex gap-2">
          <Button tone="quiet" onClick={onRetry}>
            Try again
          </Button>
          <Button tone="plain" onClick={onDrop}>
            Leave out
          </Button>
        </span>
      </li>
    );
  }
  const percent = Math.round(entry.share * 100);
  return (
    <li className="flex aspect-square flex-col items-center justify-center gap-2 rounded border border-rule bg-wash p-2 text-center text-[0.875rem]">
      <span>{percent < 100 ? `Sending, ${percent} %` : 'Being stored'}</span>
      <progress
        value={entry.share}
        max={1}
        aria-label={`Sending ${entry.file.name}`}
        className="w-full accent-petrol"
      />
    </li>
  );
}

function RemoveButton({ label, onClick }: { label: string; onClick: () => void }): ReactNode {
  return (
    <button
      type="button"
      aria-label={label}
      onClick={onClick}
      className="absolute -top-2 -right-2 grid size-12 place-items-center"
    >
      <span className="grid size-7 place-items-center rounded-full bg-ink text-paper">
        <svg viewBox="0 0 24 24" className="size-4" aria-hidden="true">
          <path d="M5 5 19 19M19 5 5 19" stroke="currentColor" strokeWidth="3" />
        </svg>
      </span>
    </button>
  );
}

function FileButton({
  text,
  isCamera,
  onFiles,
}: {
  text: string;
  isCamera?: boolean;
  onFiles: (files: File[]) => void;
}): ReactNode {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <Button tone="quiet" onClick={() => input.current?.click()}>
        {text}
      </Button>
      <input
        ref={input}
        type="file"
        accept="image/jpeg,image/png,image/webp"
        tabIndex={-1}
        aria-label={text}
        className="sr-only"
        {...(isCamera ? { capture: 'environment' as const } : { multiple: true })}
        onChange={(event) => {
          onFiles(Array.from(event.target.files ?? []));
          event.target.value = '';
        }}
      />
    </>
  );
}
