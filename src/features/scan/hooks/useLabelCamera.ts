import { useCallback, useEffect, useRef, useState, type RefObject } from 'react';
import type { CameraProblem } from '../reader/cameraProblem';
import { CameraProblemError, type CameraWatch, type LabelReader } from '../reader/labelReader';
import { readKeptLens, keepLens } from '../lensChoice';

export type CameraState =
  | { status: 'off' }
  | { status: 'starting' }
  | { status: 'running'; watch: CameraWatch }
  | { status: 'failed'; problem: CameraProblem };

export interface LabelCamera {
  state: CameraState;
  isTorchOn: boolean;
  toggleTorch: () => Promise<void>;
  chooseLens: (id: string) => void;
  restart: () => void;
}

/**
 * Runs the camera while the page is in front and `reader` is there.
 * @param isPaused the picture goes on, nothing is read
 */
export function useLabelCamera(
  video: RefObject<HTMLVideoElement | null>,
  reader: LabelReader | null,
  { isPaused, onRead }: { isPaused: boolean; onRead: (text: string) => void },
): LabelCamera {
  const [state, setState] = useState<CameraState>({ status: 'starting' });
  const [isTorchOn, setTorchOn] = useState(false);
  const [lensId, setLensId] = useState(readKeptLens);
  const [attempt, setAttempt] = useState(0);
  const isInFront = useIsInFront();
  const latest = useRef({ isPaused, onRead });
  useEffect(() => {
    latest.current = { isPaused, onRead };
  });

  useEffect(() => {
    const element = video.current;
    if (!reader || !element || !isInFront) return;
    let watch: CameraWatch | undefined;
    let isOver = false;
    const start = async (): Promise<void> => {
      setState({ status: 'starting' });
      setTorchOn(false);
      try {
        watch = await reader.watch(element, {
          lensId,
          onRead: (text) => latest.current.onRead(text),
          onEnded: () => setState({ status: 'failed', problem: 'ended' }),
        });
        if (isOver) {
          watch.stop();
          return;
        }
        watch.setPaused(latest.current.isPaused);
        setState({ status: 'running', watch });
      } catch (error) {
        if (isOver) return;
        setState({
          status: 'failed',
          problem: error instanceof CameraProblemError ? error.problem : 'unknown',
        });
      }
    };
    // Deferred: StrictMode mounts, unmounts and mounts again at once, and two starts on one video element would fight
    const timer = setTimeout(() => void start(), 0);
    return () => {
      isOver = true;
      clearTimeout(timer);
      watch?.stop();
      setState({ status: 'off' });
    };
  }, [video, reader, lensId, attempt, isInFront]);

  useEffect(() => {
    if (state.status === 'running') state.watch.setPaused(isPaused);
  }, [state, isPaused]);

  const toggleTorch = async (): Promise<void> => {
    if (state.status !== 'running') return;
    await state.watch.setTorch(!isTorchOn);
    setTorchOn(!isTorchOn);
  };
  const chooseLens = useCallback((id: string) => {
    keepLens(id);
    setLensId(id);
  }, []);
  const restart = useCallback(() => setAttempt((n) => n + 1), []);
  return { state, isTorchOn, toggleTorch, chooseLens, restart };
}

/** A phone in the pocket keeps no camera running. */
function useIsInFront(): boolean {
  const [isInFront, setInFront] = useState(!document.hidden);
  useEffect(() => {
    const update = (): void => setInFront(!document.hidden);
    document.addEventListener('visibilitychange', update);
    return () => document.removeEventListener('visibilitychange', update);
  }, []);
  return isInFront;
}
