/** What a scan can answer; each is told apart by ear and by hand as well as by eye. */
export type ScanTone = 'use' | 'stop' | 'unknown';

interface Beep {
  hz: number;
  startS: number;
  lengthS: number;
  shape: OscillatorType;
}
/** Use: two short rising notes. Stop: two long low buzzes. Unknown: one middle note. */
const TONES: Record<ScanTone, { beeps: readonly Beep[]; vibrationMs: readonly number[] }> = {
  use: {
    beeps: [
      { hz: 988, startS: 0, lengthS: 0.07, shape: 'sine' },
      { hz: 1480, startS: 0.09, lengthS: 0.1, shape: 'sine' },
    ],
    vibrationMs: [60],
  },
  stop: {
    beeps: [
      { hz: 196, startS: 0, lengthS: 0.2, shape: 'square' },
      { hz: 147, startS: 0.26, lengthS: 0.34, shape: 'square' },
    ],
    vibrationMs: [220, 90, 320],
  },
  unknown: { beeps: [{ hz: 440, startS: 0, lengthS: 0.22, shape: 'triangle' }], vibrationMs: [120, 60, 120] },
};
const SETTING = 'slingward.sound';
let context: AudioContext | null = null;

export function isSoundOn(): boolean {
  try {
    return localStorage.getItem(SETTING) !== 'off';
  } catch {
    return true;
  }
}

export function setSoundOn(isOn: boolean): void {
  try {
    localStorage.setItem(SETTING, isOn ? 'on' : 'off');
  } catch {
    return;
  }
}

/** Call from a tap: browsers keep audio silent until a person has touched the page. */
export function unlockSounds(): void {
  if (typeof AudioContext === 'undefined') return;
  context ??= new AudioContext();
  if (context.state === 'suspended') context.resume().catch(() => undefined);
}

/** Before the first tap browsers refuse to vibrate, and log that as an error. */
const mayVibrate = (): boolean =>
  'vibrate' in navigator && (!('userActivation' in navigator) || navigator.userActivation.hasBeenActive);

/** Sounds and vibrates at once, or does nothing where switched off or not possible. */
export function playScanTone(tone: ScanTone): void {
  if (!isSoundOn()) return;
  const { beeps, vibrationMs } = TONES[tone];
  if (mayVibrate()) navigator.vibrate([...vibrationMs]);
  unlockSounds();
  if (!context) return;
  for (const beep of beeps) playBeep(context, beep);
}

function playBeep(audio: AudioContext, { hz, startS, lengthS, shape }: Beep): void {
  const from = audio.currentTime + startS;
  const oscillator = audio.createOscillator();
  const gain = audio.createGain();
  oscillator.type = shape;
  oscillator.frequency.value = hz;
  // Short ramps: a hard edge clicks
  gain.gain.setValueAtTime(0, from);
  gain.gain.linearRampToValueAtTime(0.35, from + 0.01);
  gain.gain.linearRampToValueAtTime(0, from + lengthS);
  oscillator.connect(gain).connect(audio.destination);
  oscillator.start(from);
  oscillator.stop(from + lengthS + 0.02);
}
