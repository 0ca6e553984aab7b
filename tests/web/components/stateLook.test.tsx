import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { SLING_STATES } from '../../../shared/domain/lifecycle/states';
import { Band, bandWord } from '../../../src/components/sling/Band';
import { ScanAnswer } from '../../../src/components/sling/ScanAnswer';
import { lookOf, STATE_LOOKS } from '../../../src/components/sling/stateLook';
import { stateWord } from '../../../src/components/sling/StateMark';

describe('how a state looks', () => {
  it('is red with DO NOT USE for a sling in service that may not be used', () => {
    const sling = { state: 'in_service', condemned: false, mayUse: false } as const;
    expect(lookOf(sling)).toEqual({ colour: 'red', shape: 'barred_circle' });
    expect(bandWord(sling)).toBe('DO NOT USE');
    expect(stateWord(sling)).toBe('Do not use');
    expect(renderToStaticMarkup(<Band sling={sling}>Its inspection is due.</Band>)).toContain(
      'bg-signal-red',
    );
  });

  it('is green only for a sling that may be used', () => {
    for (const state of SLING_STATES) {
      expect(lookOf({ state, mayUse: false }).colour).not.toBe('green');
    }
    expect(lookOf({ state: 'in_service', mayUse: true }).colour).toBe('green');
  });

  it('never tells two meanings apart by colour alone', () => {
    const shapes = new Map<string, string>();
    for (const state of SLING_STATES) {
      const { colour, shape } = STATE_LOOKS[state];
      expect(shapes.get(shape) ?? colour).toBe(colour);
      shapes.set(shape, colour);
    }
  });

  it('says DO NOT USE beside held and condemned', () => {
    expect(bandWord({ state: 'held', condemned: false, mayUse: false })).toBe('HELD · DO NOT USE');
    expect(bandWord({ state: 'held', condemned: true, mayUse: false })).toBe('CONDEMNED · DO NOT USE');
  });
});

describe('a scan answer', () => {
  it('is green USE or red DO NOT USE, read out at once', () => {
    const use = renderToStaticMarkup(<ScanAnswer mayUse title="MQ-1" />);
    const stop = renderToStaticMarkup(<ScanAnswer mayUse={false} title="MQ-1" />);
    expect(use).toMatch(/role="alert"[^>]*bg-signal-green/);
    expect(use).toContain('>USE<');
    expect(stop).toMatch(/role="alert"[^>]*bg-signal-red/);
    expect(stop).toContain('>DO NOT USE<');
  });
});
