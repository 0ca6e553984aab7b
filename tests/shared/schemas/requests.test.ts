import { describe, expect, it } from 'vitest';
import { SLING_ACTIONS } from '../../../shared/domain/lifecycle/actions';
import { HOLD_REASONS } from '../../../shared/domain/lifecycle/reasons';
import { SLING_KINDS } from '../../../shared/domain/slings/kinds';
import { actionBodies } from '../../../shared/schemas/actions';
import { correctionRequest } from '../../../shared/schemas/corrections';
import { confirmTagRequest, REPRINT_REASON_FACTS } from '../../../shared/schemas/labels';
import { createUserRequest, newPasswordSchema } from '../../../shared/schemas/people';
import { createSlingRequest, updateSlingRequest } from '../../../shared/schemas/slings';
import { buildSlingRequest } from '../../factories/slingRequest';

const FILE = '11111111-1111-4111-8111-111111111111';
const isTaken = (schema: { safeParse: (value: unknown) => { success: boolean } }, value: unknown): boolean =>
  schema.safeParse(value).success;

describe('a sling to register', () => {
  it.each(SLING_KINDS)('of kind %s takes its own spec and no other', (kind) => {
    const body = buildSlingRequest(1, { kind });
    expect(isTaken(createSlingRequest, body)).toBe(true);
    for (const other of SLING_KINDS) {
      const { spec } = buildSlingRequest(1, { kind: other });
      expect(isTaken(createSlingRequest, { ...body, spec }), other).toBe(other === kind);
    }
  });

  it('of chain or mesh has a serial; the others a serial or a stock number', () => {
    for (const kind of SLING_KINDS) {
      const { makerSerial: _, ...body } = buildSlingRequest(1, { kind });
      expect(isTaken(createSlingRequest, body)).toBe(false);
      const isTagged = kind === 'alloy-chain' || kind === 'metal-mesh';
      expect(isTaken(createSlingRequest, { ...body, stockNumber: 'S1' }), kind).toBe(!isTagged);
    }
  });
});

describe('a change of a record', () => {
  it('is of notes, home, cost and photos alone', () => {
    expect(isTaken(updateSlingRequest, { notes: '', homeLocationId: null, cost: 0, photoIds: [FILE] })).toBe(
      true,
    );
    expect(isTaken(updateSlingRequest, { notes: 'x', number: 'y' })).toBe(false);
  });

  it('of what identifies it needs a change, a reason and evidence', () => {
    const right = { changes: { number: 'N' }, reason: 'Misread', evidenceFileIds: [FILE] };
    expect(isTaken(correctionRequest, right)).toBe(true);
    for (const wrong of [
      { ...right, changes: {} },
      { ...right, reason: ' ' },
      { ...right, evidenceFileIds: [] },
      { ...right, changes: { state: 'in_service' } },
    ]) {
      expect(isTaken(correctionRequest, wrong)).toBe(false);
    }
  });
});

describe('the body of an action', () => {
  it('exists for each action and takes nothing unknown', () => {
    expect(Object.keys(actionBodies).sort()).toEqual([...SLING_ACTIONS].sort());
    for (const action of SLING_ACTIONS) {
      expect(isTaken(actionBodies[action], { note: 'x', override: true }), action).toBe(false);
    }
  });

  it('of a hold is one tap: a reason, no photo, no note', () => {
    expect(isTaken(actionBodies.hold, { reasons: [{ code: 'damage_suspected' }] })).toBe(true);
    expect(isTaken(actionBodies.hold, { reasons: [] })).toBe(false);
  });

  it('of a hold takes only the reasons that people choose, and words with “other”', () => {
    const taken = HOLD_REASONS.filter((code) =>
      isTaken(actionBodies.hold, { reasons: [{ code, note: 'x' }] }),
    );
    // Product design, section 4: the rest comes from inspections, notices and the system.
    expect(taken).toEqual([
      'damage_suspected',
      'makers_tag_missing',
      'makers_tag_illegible',
      'overload_or_shock',
      'heat_or_chemical',
      'unauthorised_repair',
      'latch',
      'record_in_doubt',
      'other',
    ]);
    expect(isTaken(actionBodies.hold, { reasons: [{ code: 'other' }] })).toBe(false);
  });

  it('of a destruction has a method, a photo and the password', () => {
    const right = { method: 'Cut', photoIds: [FILE], fittings: [], password: 'x' };
    expect(isTaken(actionBodies.destroy, right)).toBe(true);
    for (const gone of ['method', 'photoIds', 'fittings', 'password']) {
      expect(isTaken(actionBodies.destroy, { ...right, [gone]: undefined }), gone).toBe(false);
    }
    expect(isTaken(actionBodies.destroy, { ...right, photoIds: [] })).toBe(false);
  });

  it('of a withdrawal names one reason or the condemnation, never both or none', () => {
    const right = { inspectionId: 1, photoIds: [FILE], note: 'Wrong sling' };
    expect(isTaken(actionBodies.withdraw_as_error, { ...right, reasonId: 1 })).toBe(true);
    expect(isTaken(actionBodies.withdraw_as_error, { ...right, condemnation: true })).toBe(true);
    expect(isTaken(actionBodies.withdraw_as_error, right)).toBe(false);
    expect(isTaken(actionBodies.withdraw_as_error, { ...right, reasonId: 1, condemnation: true })).toBe(
      false,
    );
  });
});

describe('labels', () => {
  it('are confirmed by something that saw them, never by typing', () => {
    for (const via of ['camera', 'photo', 'scanner']) {
      expect(isTaken(confirmTagRequest, { via, lastFour: '1234' })).toBe(true);
    }
    for (const via of ['typed', 'keyboard', undefined]) {
      expect(isTaken(confirmTagRequest, { via, lastFour: '1234' })).toBe(false);
    }
  });

  it('that are lost or misprinted are void at once, the others when the new one is on', () => {
    const atOnce = Object.entries(REPRINT_REASON_FACTS).filter(([, { voidsAtOnce }]) => voidsAtOnce);
    expect(atOnce.map(([reason]) => reason).sort()).toEqual(['lost', 'misprint']);
  });
});

describe('accounts', () => {
  const right = {
    name: 'A',
    email: 'A@B.example',
    roles: ['storekeeper'],
    siteIds: [],
    endsOn: null,
    designations: [],
  };
  it('keep the address in lower case', () => {
    expect(createUserRequest.parse(right).email).toBe('a@b.example');
  });
  it('of auditors end by date', () => {
    expect(isTaken(createUserRequest, { ...right, roles: ['auditor'] })).toBe(false);
    expect(isTaken(createUserRequest, { ...right, roles: ['auditor'], endsOn: '2027-01-01' })).toBe(true);
  });
  it('have passwords of twelve characters or more, spaces and all', () => {
    expect(isTaken(newPasswordSchema, 'x'.repeat(11))).toBe(false);
    expect(newPasswordSchema.parse(' two words here ')).toBe(' two words here ');
    expect(isTaken(newPasswordSchema, 'x'.repeat(201))).toBe(false);
  });
});
