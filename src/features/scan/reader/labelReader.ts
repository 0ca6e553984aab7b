import type { CameraProblem } from './cameraProblem';

export interface Lens {
  id: string;
  name: string;
}

/** A running camera whose picture stands in the page's own video element. */
export interface CameraWatch {
  lenses: readonly Lens[];
  /** The lens in use; null where the browser doesn't tell. */
  lensId: string | null;
  hasTorch: boolean;
  /** @throws where the camera refuses its lamp */
  setTorch(isOn: boolean): Promise<void>;
  /** While paused the picture goes on, and nothing is read. */
  setPaused(isPaused: boolean): void;
  /** Switches the camera off. */
  stop(): void;
}

export interface WatchOptions {
  /** Lens asked for; one that is gone gives way to the camera that looks away from the person. */
  lensId: string | null;
  /** Text of each code that a frame held, again and again while it stays in view. */
  onRead: (text: string) => void;
  /** The camera went away while running (pulled out, taken by a call). */
  onEnded: () => void;
}

/** All that the scan page knows of reading labels; a better reader takes the place of `browserLabelReader.ts` alone. */
export interface LabelReader {
  /** @throws CameraProblemError */
  watch(video: HTMLVideoElement, options: WatchOptions): Promise<CameraWatch>;
  /** Text of the code in a photo; null when none could be read. @throws PhotoError when it is no picture */
  readPhoto(photo: Blob): Promise<string | null>;
  close(): void;
}

export class CameraProblemError extends Error {
  constructor(readonly problem: CameraProblem) {
    super(`Camera: ${problem}`);
    this.name = 'CameraProblemError';
  }
}

/** The file was no picture that this browser can open. */
export class PhotoError extends Error {
  override name = 'PhotoError';
}
