/** Where in the video a frame is cut, and how large it is drawn; all in pixels. */
export interface FrameCut {
  x: number;
  y: number;
  width: number;
  height: number;
  drawnWidth: number;
  drawnHeight: number;
}

/** A decoder's time grows with the pixels; a label that fills a fifth of this is still 6 pixels a module. */
const LONGEST_SIDE_PX = 1280;
/** Every so many frames: the middle in full sharpness, for small labels held at a distance. */
const MIDDLE_EVERY = 3;

/** The whole picture two times out of three, else its middle half as sharp as the camera gives it. */
export function planFrame(count: number, videoWidth: number, videoHeight: number): FrameCut {
  const isMiddle =
    count % MIDDLE_EVERY === MIDDLE_EVERY - 1 && Math.max(videoWidth, videoHeight) > LONGEST_SIDE_PX;
  const share = isMiddle ? 0.5 : 1;
  const width = Math.round(videoWidth * share);
  const height = Math.round(videoHeight * share);
  const factor = Math.min(1, LONGEST_SIDE_PX / Math.max(width, height));
  return {
    x: Math.round((videoWidth - width) / 2),
    y: Math.round((videoHeight - height) / 2),
    width,
    height,
    drawnWidth: Math.max(1, Math.round(width * factor)),
    drawnHeight: Math.max(1, Math.round(height * factor)),
  };
}

export interface FrameGrabber {
  /** The next frame, or null while the video has no picture yet. */
  grab(): ImageData | null;
}

export function createFrameGrabber(video: HTMLVideoElement): FrameGrabber {
  const canvas = document.createElement('canvas');
  const context = canvas.getContext('2d', { willReadFrequently: true, alpha: false });
  let count = 0;
  return {
    grab() {
      if (!context || video.readyState < video.HAVE_CURRENT_DATA || video.videoWidth === 0) return null;
      const cut = planFrame(count++, video.videoWidth, video.videoHeight);
      if (canvas.width !== cut.drawnWidth) canvas.width = cut.drawnWidth;
      if (canvas.height !== cut.drawnHeight) canvas.height = cut.drawnHeight;
      context.drawImage(video, cut.x, cut.y, cut.width, cut.height, 0, 0, cut.drawnWidth, cut.drawnHeight);
      return context.getImageData(0, 0, cut.drawnWidth, cut.drawnHeight);
    },
  };
}
