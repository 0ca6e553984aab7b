export const CAMERA_PROBLEMS = [
  'insecure',
  'unsupported',
  'none',
  'refused',
  'busy',
  'ended',
  'unknown',
] as const;
export type CameraProblem = (typeof CAMERA_PROBLEMS)[number];

/** Why a camera can't even be asked for; null when it can. Browsers hide cameras from pages that came over plain HTTP. */
export function findObstacle(page: {
  isSecureContext: boolean;
  hasMediaDevices: boolean;
}): CameraProblem | null {
  if (page.hasMediaDevices) return null;
  return page.isSecureContext ? 'unsupported' : 'insecure';
}

/** Names from the Media Capture standard, and the older ones that phones in use still give. */
const PROBLEM_BY_NAME: Record<string, CameraProblem | undefined> = {
  NotAllowedError: 'refused',
  PermissionDeniedError: 'refused',
  SecurityError: 'refused',
  NotFoundError: 'none',
  DevicesNotFoundError: 'none',
  OverconstrainedError: 'none',
  NotReadableError: 'busy',
  TrackStartError: 'busy',
  AbortError: 'busy',
};

export function nameCameraProblem(error: unknown): CameraProblem {
  const name = typeof error === 'object' && error !== null && 'name' in error ? String(error.name) : '';
  return PROBLEM_BY_NAME[name] ?? 'unknown';
}

/** What happened, and what to do about it. Typing, a photo and a handheld scanner stay open below in every case. */
export const CAMERA_PROBLEM_WORDS = {
  insecure: {
    title: 'The camera needs a secure address',
    next: 'This page was opened over plain http, and browsers keep the camera shut there. Open the store’s https address, or take a photo of the label below.',
  },
  unsupported: {
    title: 'This browser gives no camera to pages',
    next: 'Open the page in the phone’s own browser (not inside another app), or take a photo of the label below.',
  },
  none: {
    title: 'No camera was found',
    next: 'Plug one in and try again, or use a handheld scanner, a photo, or the code typed below.',
  },
  refused: {
    title: 'The camera is not allowed here',
    next: 'Allow the camera for this page in the browser (the sign beside the address), then try again. Until then take a photo or type the code below.',
  },
  busy: {
    title: 'Another app is using the camera',
    next: 'Close the other app or a running call, then try again.',
  },
  ended: {
    title: 'The camera stopped',
    next: 'It was unplugged or taken by another app. Try again when it is free.',
  },
  unknown: {
    title: 'The camera did not start',
    next: 'Try again. If it stays so, take a photo of the label or type the code below.',
  },
} as const satisfies Record<CameraProblem, { title: string; next: string }>;
