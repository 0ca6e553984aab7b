import { openCamera } from './camera';
import { createFrameGrabber } from './frames';
import type { CameraWatch, LabelReader, WatchOptions } from './labelReader';
import { readPixels } from './photo';
import { createWorkerDecoder, type WorkerDecoder } from './workerDecoder';

/** Pause between frames: leaves the phone time for its picture, and a scan still answers within a blink. */
const FRAME_PAUSE_MS = 40;

/** Camera by @zxing/browser, decoding by the core in `shared/reader`, in a worker. */
export function createBrowserLabelReader(): LabelReader {
  const decoder = createWorkerDecoder();
  return {
    watch: (video, options) => watchCamera(decoder, video, options),
    readPhoto: async (photo) => decoder.decode(await readPixels(photo), 'still'),
    close: () => decoder.close(),
  };
}

async function watchCamera(
  decoder: WorkerDecoder,
  video: HTMLVideoElement,
  { lensId, onRead, onEnded }: WatchOptions,
): Promise<CameraWatch> {
  const camera = await openCamera(video, { lensId, onEnded });
  const grabber = createFrameGrabber(video);
  let isPaused = false;
  let isStopped = false;

  const readFrames = async (): Promise<void> => {
    while (!isStopped) {
      const frame = isPaused ? null : grabber.grab();
      const text = frame && (await decoder.decode(frame, 'live'));
      if (text && !isPaused) onRead(text);
      await new Promise((resolve) => setTimeout(resolve, FRAME_PAUSE_MS));
    }
  };
  // A worker that died ends the watch as a camera that went away does: the page offers to start again
  readFrames().catch(() => {
    if (!isStopped) onEnded();
  });

  return {
    lenses: camera.lenses,
    lensId: camera.lensId,
    hasTorch: camera.hasTorch,
    setTorch: (isOn) => camera.setTorch(isOn),
    setPaused(value) {
      isPaused = value;
      // Some phones stop a video that was out of sight
      if (!isPaused && video.paused) video.play().catch(onEnded);
    },
    stop() {
      isStopped = true;
      camera.close();
    },
  };
}
