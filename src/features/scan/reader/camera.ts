import { BrowserCodeReader } from '@zxing/browser';
import { findObstacle, nameCameraProblem } from './cameraProblem';
import { CameraProblemError, type Lens } from './labelReader';

export interface OpenCamera {
  lenses: readonly Lens[];
  lensId: string | null;
  hasTorch: boolean;
  setTorch(isOn: boolean): Promise<void>;
  close(): void;
}

const PLAY_TIMEOUT_MS = 8000;
/** Sharp enough for a 12.5 mm label at arm's length; a camera that has less gives what it has. */
const SHARPNESS = { width: { ideal: 1920 }, height: { ideal: 1080 } } as const;

/** The package keeps its way of starting a video (waiting for `canplay`, playing inline) to its subclasses. */
class VideoStarter extends BrowserCodeReader {
  static start(stream: MediaStream, video: HTMLVideoElement): Promise<HTMLVideoElement> {
    return VideoStarter.attachStreamToVideo(stream, video, PLAY_TIMEOUT_MS);
  }
}

/** Opens the camera and shows it in the video element. @throws CameraProblemError */
export async function openCamera(
  video: HTMLVideoElement,
  options: { lensId: string | null; onEnded: () => void },
): Promise<OpenCamera> {
  const obstacle = findObstacle({
    isSecureContext: window.isSecureContext,
    // Typed as always there, and missing on plain http
    hasMediaDevices: 'mediaDevices' in navigator,
  });
  if (obstacle) throw new CameraProblemError(obstacle);
  const stream = await askForStream(options.lensId);
  try {
    await VideoStarter.start(stream, video);
    return await describeCamera(stream, video, options.onEnded);
  } catch (error) {
    stopTracks(stream);
    throw new CameraProblemError(nameCameraProblem(error));
  }
}

async function describeCamera(
  stream: MediaStream,
  video: HTMLVideoElement,
  onEnded: () => void,
): Promise<OpenCamera> {
  const track = stream.getVideoTracks()[0];
  track?.addEventListener('ended', onEnded, { once: true });
  return {
    // Names and ids are told only after the permission, so this comes last
    lenses: await listLenses(),
    lensId: track?.getSettings().deviceId ?? null,
    hasTorch: track !== undefined && hasTorch(track),
    setTorch: async (isOn) => {
      if (track) await BrowserCodeReader.mediaStreamSetTorch(track, isOn);
    },
    close() {
      track?.removeEventListener('ended', onEnded);
      stopTracks(stream);
      // Another start may have given the video its own stream meanwhile
      if (video.srcObject === stream) BrowserCodeReader.cleanVideoSource(video);
    },
  };
}

async function askForStream(lensId: string | null): Promise<MediaStream> {
  const anyLens = { facingMode: { ideal: 'environment' }, ...SHARPNESS };
  const choices: MediaTrackConstraints[] =
    lensId === null ? [anyLens] : [{ deviceId: { exact: lensId }, ...SHARPNESS }, anyLens];
  let last: unknown;
  for (const video of choices) {
    try {
      return await navigator.mediaDevices.getUserMedia({ video, audio: false });
    } catch (error) {
      last = error;
      if (nameCameraProblem(error) !== 'none') break;
    }
  }
  throw new CameraProblemError(nameCameraProblem(last));
}

async function listLenses(): Promise<Lens[]> {
  const devices = await BrowserCodeReader.listVideoInputDevices();
  return devices.map((device, i) => ({ id: device.deviceId, name: device.label || `Camera ${i + 1}` }));
}

function hasTorch(track: MediaStreamTrack): boolean {
  return (
    typeof track.getCapabilities === 'function' && BrowserCodeReader.mediaStreamIsTorchCompatibleTrack(track)
  );
}

function stopTracks(stream: MediaStream): void {
  for (const track of stream.getTracks()) track.stop();
}
