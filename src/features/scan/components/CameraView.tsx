import { useRef, useState, type ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { cx } from '../../../lib/cx';
import { useLabelCamera, type LabelCamera } from '../hooks/useLabelCamera';
import type { useLabelReader } from '../hooks/useLabelReader';
import { CAMERA_PROBLEM_WORDS } from '../reader/cameraProblem';
import { LensSelect } from './LensSelect';

interface CameraViewProps {
  reader: ReturnType<typeof useLabelReader>;
  /** While an answer stands above, the camera waits. */
  isPaused: boolean;
  onRead: (text: string) => void;
}

/** The camera's picture with a frame to hold the label into, its lamp and lenses, or why there is no picture. */
export function CameraView({ reader, isPaused, onRead }: CameraViewProps): ReactNode {
  const video = useRef<HTMLVideoElement>(null);
  // Opened straight onto an answer, the page doesn't ask for the camera before the person wants to scan on
  const [isWanted, setWanted] = useState(!isPaused);
  if (!isPaused && !isWanted) setWanted(true);
  const camera = useLabelCamera(video, isWanted ? reader.reader : null, { isPaused, onRead });
  const { state } = camera;
  const isFailed = state.status === 'failed' || reader.hasFailed;
  return (
    <section aria-label="Camera" className={cx(isPaused && 'hidden')}>
      <div
        className={cx(
          'on-signal relative aspect-[4/3] max-h-[58dvh] w-full overflow-hidden bg-[#141b21] text-white lg:rounded-[14px]',
          isFailed && 'hidden',
        )}
      >
        <video ref={video} muted playsInline aria-label="Camera picture" className="size-full object-cover" />
        <FrameCorners isRunning={state.status === 'running'} />
        <p role="status" className="absolute bottom-3 left-4 rounded bg-black/60 px-2.5 py-1 font-medium">
          {state.status === 'running' ? 'Hold a label into the frame' : 'Starting the camera'}
        </p>
        {state.status === 'running' && state.watch.hasTorch && <TorchButton camera={camera} />}
      </div>
      {reader.hasFailed && (
        <Failed
          title="The reader could not be fetched"
          next="The network went away while the page was loading. Load the page again; typing the code works meanwhile."
          button="Load the page again"
          onRetry={() => window.location.reload()}
        />
      )}
      {state.status === 'failed' && (
        <Failed {...CAMERA_PROBLEM_WORDS[state.problem]} button="Try again" onRetry={camera.restart} />
      )}
      {state.status === 'running' && state.watch.lenses.length > 1 && (
        <div className="px-4 pt-3 sm:px-6 lg:px-0">
          <LensSelect lenses={state.watch.lenses} lensId={state.watch.lensId} onChoose={camera.chooseLens} />
        </div>
      )}
    </section>
  );
}

function Failed({
  title,
  next,
  button,
  onRetry,
}: {
  title: string;
  next: string;
  button: string;
  onRetry: () => void;
}): ReactNode {
  return (
    <div className="px-4 pt-7 sm:px-6 lg:px-0 lg:pt-0">
      <Notice
        tone="warn"
        title={title}
        action={
          <Button tone="quiet" onClick={onRetry}>
            {button}
          </Button>
        }
      >
        {next}
      </Notice>
    </div>
  );
}

function TorchButton({ camera }: { camera: LabelCamera }): ReactNode {
  const [isRefused, setRefused] = useState(false);
  return (
    <button
      type="button"
      aria-pressed={camera.isTorchOn}
      disabled={isRefused}
      onClick={() => void camera.toggleTorch().catch(() => setRefused(true))}
      className={cx(
        'absolute right-3 bottom-3 inline-flex min-h-target items-center gap-2 rounded-full px-4 font-semibold',
        camera.isTorchOn
          ? 'bg-white text-[#17212b]'
          : 'bg-black/60 text-white ring-1 ring-white/60 ring-inset',
      )}
    >
      <svg viewBox="0 0 24 24" className="size-6" aria-hidden="true">
        <path
          d="M8 3h8v4l-2 3v11h-4V10L8 7ZM12 13v3M8 7h8"
          fill="none"
          stroke="currentColor"
          strokeWidth="2"
          strokeLinejoin="round"
        />
      </svg>
      {isRefused ? 'No lamp' : 'Lamp'}
    </button>
  );
}

/** Four corners: where to hold the label. */
function FrameCorners({ isRunning }: { isRunning: boolean }): ReactNode {
  return (
    <svg
      viewBox="0 0 100 100"
      className={cx('absolute inset-0 m-auto h-3/5 max-w-4/5', isRunning ? 'opacity-100' : 'opacity-40')}
      aria-hidden="true"
    >
      <path
        d="M2 22V8a6 6 0 0 1 6-6h14M78 2h14a6 6 0 0 1 6 6v14M98 78v14a6 6 0 0 1-6 6H78M22 98H8a6 6 0 0 1-6-6V78"
        fill="none"
        stroke="#fff"
        strokeWidth="2.6"
        strokeLinecap="round"
      />
    </svg>
  );
}
