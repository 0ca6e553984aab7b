/**
 * The lifecycle a second time, written from the product design (sections 4 and 5) without the product's code:
 * what a sling is, who may do what with it, and what then becomes of it.
 */
export type State =
  'received' | 'in_service' | 'held' | 'sent_for_evaluation' | 'returned' | 'destroyed' | 'lost' | 'departed';
export type Outcome = 'fit' | 'repaired' | 'unfit' | 'not_examined' | 'destroyed';
export type InspectionType = 'initial' | 'frequent' | 'periodic' | 'release';
export type Verdict = 'pass' | 'refer' | 'reject';

export interface Reason {
  code: string;
  confirmed: boolean;
  /** Account name; null when the system placed it. */
  by: string | null;
  seq: number;
}

export interface Model {
  isChain: boolean;
  isHired: boolean;
  state: State;
  condemned: { by: string; seq: number } | null;
  reasons: Reason[];
  /** Rows of its ledger so far. */
  seq: number;
  label: 'none' | 'printed' | 'live';
  inspections: { type: InspectionType; by: string; seq: number; verdict: Verdict }[];
  lastInService: number | null;
  lastSent: number | null;
  cameBack: number | null;
  line: { outcome: Outcome | null; hasReport: boolean; isProven: boolean } | null;
  custody: string;
}

export const newModel = (isChain: boolean, isHired: boolean): Model => ({
  isChain,
  isHired,
  state: 'received',
  condemned: null,
  reasons: [],
  seq: 1,
  label: 'none',
  inspections: [],
  lastInService: null,
  lastSent: null,
  cameBack: null,
  line: null,
  custody: 'in_store',
});

const STORE = ['storekeeper', 'inspector', 'manager'];
const ANY_HELD = ['held', 'held+'];
const ANY_SENT = ['sent_for_evaluation', 'sent_for_evaluation+'];
const FREE = ['received', 'in_service', 'returned'];

/** Section 4: from where (condemned with a +) and by whom. */
export const TABLE: Record<string, { from: string[]; by: string[] }> = {
  accept: { from: ['received'], by: ['inspector'] },
  hold: { from: [...FREE, ...ANY_HELD, ...ANY_SENT, 'lost', 'lost+'], by: STORE },
  secure: { from: ANY_HELD, by: STORE },
  release: { from: ['held'], by: ['inspector'] },
  condemn: { from: ['held'], by: ['manager'] },
  withdraw_as_error: { from: ANY_HELD, by: ['manager'] },
  send: { from: ANY_HELD, by: ['manager'] },
  receive_back: { from: ANY_SENT, by: STORE },
  return_to_service: { from: ['returned'], by: ['inspector'] },
  destroy: { from: ['held+'], by: STORE },
  destroyed_by_evaluator: { from: ANY_SENT, by: ['manager'] },
  report_lost: { from: [...FREE, ...ANY_HELD, ...ANY_SENT], by: ['manager'] },
  found: { from: ['lost', 'lost+'], by: STORE },
  depart: { from: [...FREE, 'held'], by: ['manager'] },
};
export const ACTIONS = Object.keys(TABLE);

export const roleOf = (account: string): string => account.replace(/\d$/, '');
export const placeOf = ({ state, condemned }: Model): string => (condemned ? `${state}+` : state);
export const allowedFrom = (model: Model): string[] =>
  ACTIONS.filter((action) => TABLE[action]?.from.includes(placeOf(model)));

/** A rejection is never cleared; once withdrawn as error it is, like any other reason. */
export function isClearable({ isChain }: Model, { code, confirmed }: Reason): boolean {
  return !confirmed && (isChain || code !== 'heat_or_chemical');
}
export const asksEvidence = (code: string): boolean =>
  code.startsWith('makers_tag_') || code === 'heat_or_chemical';

function hasInitial({ inspections }: Model): boolean {
  return inspections.filter(({ type }) => type === 'initial').at(-1)?.verdict === 'pass';
}

/** What return_to_service asks of the evaluation, and release of a sling that was sent since it was in service. */
function isProvenByEvaluation({ line, isChain }: Model): boolean {
  if (!line?.hasReport) return false;
  return line.outcome === 'fit' || (line.outcome === 'repaired' && isChain && line.isProven);
}

function hasRelease({ inspections }: Model, after: number, by?: string): boolean {
  return inspections.some(
    (one) =>
      one.type === 'release' &&
      one.verdict === 'pass' &&
      one.seq > after &&
      (by === undefined || one.by === by),
  );
}

export const wasSent = ({ lastSent, lastInService }: Model): boolean =>
  lastSent !== null && lastSent > (lastInService ?? 0);

export const mayAccept = (model: Model): boolean => hasInitial(model) && model.label === 'live';

export function mayRelease(model: Model, by: string): boolean {
  const after = Math.max(model.cameBack ?? 0, ...model.reasons.map(({ seq }) => seq));
  return (
    model.label === 'live' &&
    model.reasons.every((reason) => isClearable(model, reason)) &&
    hasRelease(model, after, by) &&
    (model.lastInService !== null || hasInitial(model)) &&
    (!wasSent(model) || isProvenByEvaluation(model))
  );
}

export function mayReturn(model: Model): boolean {
  return (
    model.label === 'live' &&
    isProvenByEvaluation(model) &&
    hasRelease(model, model.cameBack ?? 0) &&
    model.reasons.every(({ seq }) => seq <= (model.lastSent ?? 0))
  );
}

export function mayDepart(model: Model, cause: string): boolean {
  const isRejected = model.reasons.some(({ confirmed }) => confirmed);
  if (model.state === 'held' && !(model.isHired && cause === 'off_hire')) return false;
  if (isRejected && !model.isHired) return false;
  return model.isHired ? cause !== 'sold' : cause !== 'off_hire';
}

/** Usable: in service, label live; a complete pass set a due date that lies a year ahead. The maker's tag stays legible here. */
export const mayUse = (model: Model): boolean =>
  model.state === 'in_service' && model.label === 'live' && model.inspections.some(isDueSetting);
const isDueSetting = ({ type, verdict }: Model['inspections'][number]): boolean =>
  type !== 'frequent' && verdict === 'pass';

/** Places reasons with the row that is written next. */
export function addReasons(model: Model, reasons: { code: string; by: string | null }[]): void {
  const confirmed = ['criterion', 'unauthorised_repair', 'evaluation_unfit'];
  for (const { code, by } of reasons) {
    model.reasons.push({ code, by, confirmed: confirmed.includes(code), seq: model.seq + 1 });
  }
}

export function hold(model: Model, code: string, by: string | null): void {
  const isFound = model.state === 'lost';
  addReasons(model, [...(isFound ? [{ code: 'found', by: null }] : []), { code, by }]);
  if (model.state !== 'sent_for_evaluation') model.state = 'held';
  model.seq += 1;
}

export function intoService(model: Model): void {
  model.state = 'in_service';
  model.reasons = [];
  model.seq += 1;
  model.lastInService = model.seq;
  if (model.custody === 'cage' || model.custody === 'unknown') model.custody = 'in_store';
}

export function receiveBack(model: Model, custody: string): void {
  const outcome = model.line?.outcome ?? null;
  const isGood = outcome === 'fit' || outcome === 'repaired';
  const wasReported = model.reasons.some(({ seq }) => seq > (model.lastSent ?? 0));
  if (outcome === 'unfit') addReasons(model, [{ code: 'evaluation_unfit', by: null }]);
  else if (!model.condemned && !isGood) addReasons(model, [{ code: 'record_in_doubt', by: null }]);
  model.state = isGood && !model.condemned && !wasReported ? 'returned' : 'held';
  model.seq += 1;
  model.cameBack = model.seq;
  model.custody = custody;
}

/** An outcome is written down; after the sling came back it has the effect that it would have had then. */
export function recordOutcome(model: Model, outcome: Outcome): void {
  const isGood = outcome === 'fit' || outcome === 'repaired';
  const since = model.reasons.filter(({ seq }) => seq > (model.lastSent ?? 0));
  const isOnlyDoubt =
    since.length === 1 && since[0]?.code === 'record_in_doubt' && since[0].seq === model.cameBack;
  model.seq += 1;
  if (model.state === 'held' && !model.condemned && isGood && isOnlyDoubt) {
    model.reasons = model.reasons.filter((reason) => reason !== since[0]);
    model.state = 'returned';
    model.cameBack = model.seq;
    return;
  }
  const isHere = ['held', 'returned', 'in_service'].includes(model.state);
  const code =
    outcome === 'unfit' ? 'evaluation_unfit' : isGood || model.condemned ? null : 'record_in_doubt';
  if (isHere && code && !model.reasons.some((open) => open.code === code)) hold(model, code, null);
}
