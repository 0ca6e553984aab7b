import { describe, expect, it } from 'vitest';
import { parsePort, parseStartOptions } from '../../scripts/lib/startOptions.mjs';
import { checkNodeVersion } from '../../scripts/lib/nodeVersion.mjs';

describe('options of npm start', () => {
  it('loads the demo and stays on this machine by default', () => {
    expect(parseStartOptions([])).toEqual({ isLan: false, hasDemo: true });
  });

  it('knows --lan and --no-demo in any order', () => {
    expect(parseStartOptions(['--no-demo', '--lan'])).toEqual({ isLan: true, hasDemo: false });
  });

  it('names an option that does not exist', () => {
    expect(() => parseStartOptions(['--lan', '--demo'])).toThrow('There is no option "--demo"');
  });
});

describe('PORT', () => {
  it('is 4173 unless given', () => {
    expect([parsePort(undefined), parsePort('')]).toEqual([4173, 4173]);
  });

  it.each([
    ['1', 1],
    ['8080', 8080],
    ['65535', 65535],
  ])('takes %s', (text, port) => {
    expect(parsePort(text)).toBe(port);
  });

  it.each(['0', '65536', '-1', '80.5', '0x50', 'http', ' 80'])('refuses "%s"', (text) => {
    expect(() => parsePort(text)).toThrow('must be a number from 1 to 65535');
  });
});

describe('the version of Node.js', () => {
  it.each(['20.19.0', '20.20.2', '22.0.0', '25.1.0'])('%s is new enough', (version) => {
    expect(() => checkNodeVersion(version)).not.toThrow();
  });

  it.each(['18.20.8', '20.18.3', '16.0.0'])('%s is too old, and the sentence says both', (version) => {
    expect(() => checkNodeVersion(version)).toThrow(
      `Slingward needs Node.js 20.19 or newer, this is ${version}: install a newer one, then start again.`,
    );
  });
});
