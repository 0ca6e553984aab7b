import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

/** WCAG 2.2, success criteria 1.4.3, 1.4.6 and 1.4.11; relative luminance by its own definition. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const c = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
function contrast(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

const css = readFileSync('src/styles.css', 'utf8');
const config = readFileSync('tailwind.config.ts', 'utf8');
const [light = '', dark = ''] = css.split("[data-theme='dark']");
const token = (theme: string, name: string): string => {
  const found = new RegExp(`--${name}: (#[0-9a-f]{6})`).exec(theme)?.[1];
  if (!found) throw new Error(`no token ${name}`);
  return found;
};

describe.each([
  ['light', light],
  ['dark', dark],
])('in the %s theme', (_, theme) => {
  it.each([
    ['ink', 'paper'],
    ['ink', 'card'],
    ['ink', 'wash'],
    ['muted', 'paper'],
    ['muted', 'card'],
    ['muted', 'wash'],
    ['petrol', 'paper'],
    ['petrol', 'card'],
    ['petrol', 'petrol-wash'],
    ['petrol-ink', 'petrol'],
    ['danger', 'paper'],
    ['danger', 'card'],
    ['ink', 'danger-wash'],
    ['danger', 'danger-wash'],
    ['ink', 'warn-wash'],
    ['warn', 'warn-wash'],
    ['ink', 'petrol-wash'],
    ['plate-ink', 'plate-top'],
    ['plate-ink', 'plate-low'],
    ['plate-muted', 'plate-top'],
    ['plate-muted', 'plate-low'],
  ])('%s reads on %s', (text, ground) => {
    expect(contrast(token(theme, text), token(theme, ground))).toBeGreaterThanOrEqual(4.5);
  });

  it.each(['mark-red', 'mark-green', 'mark-blue', 'mark-black', 'mark-grey', 'edge', 'petrol'])(
    '%s is seen on paper and card',
    (name) => {
      expect(contrast(token(theme, name), token(theme, 'paper'))).toBeGreaterThanOrEqual(3);
      expect(contrast(token(theme, name), token(theme, 'card'))).toBeGreaterThanOrEqual(3);
    },
  );
});

describe('a signal fill', () => {
  const fill = (name: string): string => {
    const found = new RegExp(`${name}: '(#[0-9A-F]{6})'`, 'i').exec(config)?.[1];
    if (!found) throw new Error(`no fill ${name}`);
    return found;
  };
  // Band and scan answer carry large text only: AAA for large text is 4.5
  it.each(['red', 'green', 'blue', 'black', 'grey'])('%s carries white', (name) => {
    expect(contrast(fill(name), '#ffffff')).toBeGreaterThanOrEqual(4.5);
  });
  it('yellow carries ink', () => {
    expect(contrast(fill('yellow'), '#17212b')).toBeGreaterThanOrEqual(4.5);
  });
});
