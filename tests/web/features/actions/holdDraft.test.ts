import { describe, expect, it } from 'vitest';
import { CHOOSABLE_REASONS } from '../../../../shared/domain/lifecycle/reasons';
import { actionBodies } from '../../../../shared/schemas/actions';
import {
  EMPTY_HOLD,
  holdDraftSchema,
  isChoosable,
  needsNote,
  toggleReason,
  toHoldBody,
} from '../../../../src/features/actions/holdDraft';

describe('a hold being chosen', () => {
  it('switches reasons on and off, in the order of the tiles', () => {
    const both = toggleReason(toggleReason(EMPTY_HOLD, 'other'), 'damage_suspected');
    expect(both.codes).toEqual(['damage_suspected', 'other']);
    expect(toggleReason(both, 'damage_suspected').codes).toEqual(['other']);
  });

  it('asks for words only where a reason says nothing without them', () => {
    expect(needsNote(toggleReason(EMPTY_HOLD, 'damage_suspected'))).toBe(false);
    expect(needsNote(toggleReason(EMPTY_HOLD, 'other'))).toBe(true);
  });

  it('sends the note with "other" alone, and photos only where there are some', () => {
    const draft = { ...toggleReason(toggleReason(EMPTY_HOLD, 'latch'), 'other'), note: ' fell ' };
    expect(toHoldBody(draft)).toEqual({ reasons: [{ code: 'latch' }, { code: 'other', note: 'fell' }] });
    const photoIds = ['0b9e3a3e-6d0f-4b43-9c7a-2f6f3b8f2a11'];
    expect(toHoldBody({ ...draft, photoIds }).photoIds).toEqual(photoIds);
  });

  it('makes a body that the API takes, for every tile', () => {
    for (const code of CHOOSABLE_REASONS) {
      const body = toHoldBody({ ...toggleReason(EMPTY_HOLD, code), note: 'seen at the counter' });
      expect(actionBodies.hold.safeParse(body).success).toBe(true);
    }
  });

  it('arms no tile from an address with a reason that is not chosen by hand', () => {
    expect(isChoosable('latch')).toBe(true);
    expect(isChoosable('criterion')).toBe(false);
    expect(isChoosable(null)).toBe(false);
    expect(holdDraftSchema.safeParse({ ...EMPTY_HOLD, codes: ['criterion'] }).success).toBe(false);
  });
});
