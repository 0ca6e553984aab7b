import { useRef, useState, type ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { PhotoError, type LabelReader } from '../reader/labelReader';

const FAILURES = {
  nothing: {
    title: 'No label could be read in this photo',
    next: 'Take it again from nearer, square on, so that the code fills about half of the picture; wipe the label first. Or type the code that stands under it.',
  },
  not_picture: {
    title: 'This file can’t be opened as a picture',
    next: 'Choose a photo (JPEG, PNG or WebP).',
  },
  broken: {
    title: 'The photo could not be read',
    next: 'Try again, or type the code that stands under the label’s picture.',
  },
} as const;

/** A label on a photo, from the camera app or the gallery. */
export function PhotoReader({
  reader,
  onRead,
}: {
  reader: LabelReader | null;
  onRead: (text: string) => void;
}): ReactNode {
  const [isBusy, setBusy] = useState(false);
  const [failure, setFailure] = useState<keyof typeof FAILURES | null>(null);

  const readPhoto = async (photo: File): Promise<void> => {
    if (!reader) return;
    setBusy(true);
    setFailure(null);
    try {
      const text = await reader.readPhoto(photo);
      if (text === null) setFailure('nothing');
      else onRead(text);
    } catch (error) {
      setFailure(error instanceof PhotoError ? 'not_picture' : 'broken');
    } finally {
      setBusy(false);
    }
  };

  return (
    <div className="flex flex-col gap-3">
      <p className="font-semibold">A photo of the label</p>
      <div className="flex flex-wrap gap-3 *:flex-1">
        <PhotoButton text="Take a photo" isCamera isBusy={isBusy} onPhoto={readPhoto} />
        <PhotoButton text="Choose a photo" isBusy={isBusy} onPhoto={readPhoto} />
      </div>
      {failure && (
        <Notice tone="warn" title={FAILURES[failure].title}>
          {FAILURES[failure].next}
        </Notice>
      )}
    </div>
  );
}

function PhotoButton({
  text,
  isCamera = false,
  isBusy,
  onPhoto,
}: {
  text: string;
  isCamera?: boolean;
  isBusy: boolean;
  onPhoto: (photo: File) => Promise<void>;
}): ReactNode {
  const input = useRef<HTMLInputElement>(null);
  return (
    <div className="flex">
      <Button tone="quiet" wide pending={isBusy} pendingText="Reading" onClick={() => input.current?.click()}>
        {text}
      </Button>
      <input
        ref={input}
        type="file"
        accept="image/*"
        tabIndex={-1}
        aria-label={text}
        className="sr-only"
        {...(isCamera ? { capture: 'environment' as const } : {})}
        onChange={(event) => {
          const photo = event.target.files?.[0];
          if (photo) void onPhoto(photo);
          event.target.value = '';
        }}
      />
    </div>
  );
}
