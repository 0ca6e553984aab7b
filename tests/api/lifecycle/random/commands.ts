import {
  ACTIONS,
  addReasons,
  asksEvidence,
  hold,
  intoService,
  mayAccept,
  mayDepart,
  mayRelease,
  mayReturn,
  placeOf,
  receiveBack,
  recordOutcome,
  roleOf,
  TABLE,
  type InspectionType,
  type Model,
  type Outcome,
  type Verdict,
} from './model';

/** Random figures that become a command once the state is known; small figures are simple commands. */
export interface Draw {
  pick: number;
  person: number;
  variant: number;
  oddity: number;
}

export interface Command {
  name: string;
  by: string;
  variant: number;
  /** An old version in If-Match; a sling that is not there; one of a site where the person does not work. */
  oddity: 'none' | 'stale' | 'unknown' | 'elsewhere';
}

export const PEOPLE = [
  'storekeeper',
  'inspector',
  'manager',
  'inspector2',
  'manager2',
  'storekeeper2',
  'admin',
  'auditor',
  'guest',
];
const HELPERS = ['print', 'confirm', 'void', 'inspect', 'outcome'];
const HELPER_ROLES: Record<string, string[]> = {
  print: ['storekeeper', 'inspector', 'manager'],
  confirm: ['storekeeper', 'inspector', 'manager'],
  void: ['storekeeper', 'inspector', 'manager'],
  inspect: ['inspector'],
  outcome: ['manager'],
};

/** Steps that lead further from each state, some with the variant that does it: random walks then get everywhere. */
const LEADS: Record<string, [name: string, variant?: number][]> = {
  received: [['accept'], ['inspect', 1], ['print', 0], ['confirm'], ['hold'], ['inspect']],
  in_service: [['hold'], ['hold', 0], ['inspect'], ['report_lost'], ['outcome'], ['depart']],
  held: [
    ['inspect', 0],
    ['release', 0],
    ['inspect', 0],
    ['release', 0],
    ['secure', 0],
    ['send'],
    ['send', 0],
    ['condemn'],
    ['withdraw_as_error', 0],
    ['confirm'],
    ['print', 0],
    ['inspect', 1],
  ],
  'held+': [
    ['destroy'],
    ['inspect', 4],
    ['withdraw_as_error', 0],
    ['withdraw_as_error', 0],
    ['send'],
    ['secure', 0],
  ],
  sent_for_evaluation: [
    ['receive_back'],
    ['outcome', 0],
    ['outcome', 12 + 2],
    ['outcome'],
    ['hold'],
    ['outcome', 5],
  ],
  'sent_for_evaluation+': [['receive_back'], ['outcome', 5], ['destroyed_by_evaluator'], ['report_lost']],
  returned: [
    ['return_to_service'],
    ['inspect', 0],
    ['return_to_service'],
    ['hold'],
    ['outcome'],
    ['confirm'],
  ],
  lost: [['found'], ['hold']],
  'lost+': [['found'], ['hold']],
};
const EVERYTHING = [...ACTIONS, ...HELPERS];

const take = <T>(list: readonly T[], figure: number, otherwise: T): T =>
  list[figure % list.length] ?? otherwise;

export function chooseCommand(model: Model, { pick, person, variant, oddity }: Draw): Command {
  const leads = LEADS[placeOf(model)] ?? [];
  const isLeading = pick % 10 < 7 && leads.length > 0;
  const figure = Math.floor(pick / 10);
  const [name, given = variant] = isLeading
    ? take(leads, figure, ['hold'])
    : [take(EVERYTHING, figure, 'hold')];
  const roles = TABLE[name]?.by ?? HELPER_ROLES[name] ?? [];
  const able = PEOPLE.filter((account) => roles.includes(roleOf(account)));
  const anyone = take(person % 8 === 7 ? PEOPLE : able, Math.floor(person / 8), 'storekeeper');
  // Whoever inspected it is the one who releases it, most times.
  const inspector =
    isLeading && name === 'release' && person % 4 !== 3 ? model.inspections.at(-1)?.by : undefined;
  const isAction = ACTIONS.includes(name) && name !== 'send' && name !== 'destroyed_by_evaluator';
  const odd = isAction ? take(['stale', 'unknown', 'elsewhere'] as const, oddity, 'stale') : 'none';
  return { name, by: inspector ?? anyone, variant: given, oddity: oddity < 92 ? 'none' : odd };
}

export const HOLD_CODES = [
  'damage_suspected',
  'latch',
  'makers_tag_missing',
  'heat_or_chemical',
  'overload_or_shock',
  'other',
  'unauthorised_repair',
];
const INSPECTIONS: [InspectionType, Verdict][] = [
  ['release', 'pass'],
  ['initial', 'pass'],
  ['release', 'pass'],
  ['initial', 'pass'],
  ['periodic', 'pass'],
  ['frequent', 'pass'],
  ['release', 'refer'],
  ['frequent', 'reject'],
];
const OUTCOMES: Outcome[] = ['fit', 'fit', 'repaired', 'unfit', 'not_examined', 'destroyed'];

/** What the variant figure says about the body. */
export const variants = {
  holdCode: (v: number) => take(HOLD_CODES, v, 'latch'),
  inspection: (v: number) => take(INSPECTIONS, v, ['release', 'pass'] as [InspectionType, Verdict]),
  isInCage: (v: number) => v % 5 !== 4,
  clearing: (v: number) => take(['all', 'all', 'all', 'without evidence', 'none'] as const, v, 'all'),
  purpose: (v: number, model: Model) =>
    v % 6 === 5
      ? take(['evaluate', 'repair', 'destroy'] as const, Math.floor(v / 6), 'evaluate')
      : model.condemned
        ? 'destroy'
        : take(['evaluate', 'repair'] as const, v, 'evaluate'),
  outcome: (v: number) => take(OUTCOMES, v, 'fit'),
  hasReport: (v: number) => v % 4 !== 3,
  isProven: (v: number) => v % 5 !== 4,
  cause: (v: number) =>
    take(['off_hire', 'sold', 'transferred_out', 'registered_in_error'] as const, v, 'transferred_out'),
  withdrawsCondemnation: (v: number, model: Model) => (model.condemned ? v % 4 !== 3 : v % 8 === 7),
  saysAllFates: (v: number) => v % 4 !== 3,
  printReason: (v: number) => (v % 3 === 2 ? undefined : 'lost'),
};

/** The status that the design asks for; when it is a success, the model has moved on. */
export function expectStatusOf(model: Model, command: Command): number {
  const { name, by, oddity, variant } = command;
  const roles = TABLE[name]?.by ?? HELPER_ROLES[name] ?? [];
  if (by === 'guest') return 401;
  if (!roles.includes(roleOf(by))) return 403;
  if (oddity === 'unknown' || (oddity === 'elsewhere' && !by.endsWith('2'))) return 404;
  // A draft looks at the purpose before anything is sent.
  if (name === 'send' && !isPurposeOpen(model, variant)) return 422;
  if (oddity === 'stale' && name !== 'hold' && model.seq > 1) return 412;
  if (name in TABLE && !TABLE[name]?.from.includes(placeOf(model))) return 409;
  return EFFECTS[name]?.(model, command) ?? 500;
}

function isPurposeOpen(model: Model, variant: number): boolean {
  const purpose = variants.purpose(variant, model);
  return (purpose === 'destroy') === (model.condemned !== null) && (purpose !== 'repair' || model.isChain);
}

const step = (model: Model, changes: Partial<Model> = {}): number => {
  Object.assign(model, changes, { seq: model.seq + 1 });
  return 200;
};
const done = (act: () => void, status = 200): number => {
  act();
  return status;
};
const isGone = ({ state }: Model): boolean => state === 'destroyed' || state === 'departed';

type Effect = (model: Model, command: Command) => number;
const EFFECTS: Record<string, Effect> = {
  accept: (model) => (mayAccept(model) ? done(() => intoService(model)) : 422),
  hold: (model, { by, variant }) =>
    done(() => {
      if (model.state === 'lost') model.custody = 'unknown';
      hold(model, variants.holdCode(variant), by);
    }),
  secure: (model, { variant }) => (variants.isInCage(variant) ? step(model, { custody: 'cage' }) : 422),
  release(model, { by, variant }) {
    if (model.reasons.some((reason) => reason.by === by)) return 403;
    const clearing = variants.clearing(variant);
    const isBodyGood =
      clearing === 'all' ||
      model.reasons.length === 0 ||
      (clearing === 'without evidence' && !model.reasons.some(({ code }) => asksEvidence(code)));
    return mayRelease(model, by) && isBodyGood ? done(() => intoService(model)) : 422;
  },
  condemn: (model, { by }) => step(model, { condemned: { by, seq: model.seq + 1 } }),
  withdraw_as_error: withdraw,
  send: (model) =>
    model.custody === 'cage'
      ? step(model, {
          state: 'sent_for_evaluation',
          custody: 'evaluator',
          lastSent: model.seq + 1,
          line: { outcome: null, hasReport: false, isProven: false },
        })
      : 422,
  receive_back: (model, { variant }) =>
    done(() => receiveBack(model, variants.isInCage(variant) ? 'cage' : 'in_store')),
  return_to_service: (model) => (mayReturn(model) ? done(() => intoService(model)) : 422),
  destroy(model, { by, variant }) {
    if (model.condemned?.by === by) return 403;
    if (!variants.saysAllFates(variant)) return 422;
    return step(model, { state: 'destroyed', custody: 'none', label: 'none' });
  },
  destroyed_by_evaluator: (model) =>
    model.line?.outcome === 'destroyed' && model.line.hasReport
      ? step(model, { state: 'destroyed', custody: 'none', label: 'none' })
      : 422,
  report_lost: (model) => step(model, { state: 'lost', custody: 'unknown' }),
  found: (model, { variant }) =>
    done(() => {
      addReasons(model, [{ code: 'found', by: null }]);
      step(model, { state: 'held', custody: variants.isInCage(variant) ? 'cage' : 'unknown' });
    }),
  depart: (model, { variant }) =>
    mayDepart(model, variants.cause(variant))
      ? step(model, { state: 'departed', custody: 'none', label: 'none' })
      : 422,
  print(model, { variant }) {
    if (isGone(model)) return 422;
    if (model.label !== 'none' && variants.printReason(variant) === undefined) return 422;
    return done(() => step(model, { label: 'printed' }), 201);
  },
  confirm: (model) => (model.label === 'printed' ? step(model, { label: 'live' }) : 409),
  void: (model) => (model.label === 'none' ? 409 : step(model, { label: 'none' })),
  inspect(model, { by, variant }) {
    if (!['received', 'in_service', 'held', 'returned'].includes(model.state)) return 409;
    const [type, verdict] = variants.inspection(variant);
    step(model);
    model.inspections.push({ type, verdict, by, seq: model.seq });
    if (verdict !== 'pass') hold(model, verdict === 'reject' ? 'criterion' : 'referred', by);
    return 201;
  },
  outcome(model, { variant }) {
    const { line } = model;
    if (!line) return 404;
    if (line.outcome === 'destroyed' && model.state === 'destroyed') return 409;
    const outcome = variants.outcome(variant);
    line.outcome = outcome;
    line.hasReport = variants.hasReport(variant);
    line.isProven = variants.isProven(variant);
    return done(() => recordOutcome(model, outcome));
  },
};

/** Two people, neither the author, and a complete new inspection that does not reject again. */
function withdraw(model: Model, { by, variant }: Command): number {
  const isCondemnation = variants.withdrawsCondemnation(variant, model);
  const reason = model.reasons.find(({ confirmed }) => confirmed);
  const withdrawn = isCondemnation ? model.condemned : reason;
  const inspection = model.inspections.at(-1);
  if (!withdrawn || !inspection) return 422;
  if (withdrawn.by === by || withdrawn.by === inspection.by) return 403;
  const isNew = inspection.seq > withdrawn.seq && inspection.type !== 'frequent';
  if (!isNew || inspection.verdict === 'reject') return 422;
  if (isCondemnation) return step(model, { condemned: null });
  if (reason) reason.confirmed = false;
  return step(model);
}
