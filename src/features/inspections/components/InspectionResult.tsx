import type { ReactNode } from 'react';
import { findCriterion } from '../../../../shared/domain/inspection/catalogue';
import { INSPECTION_TYPE_FACTS } from '../../../../shared/domain/inspection/inspectionTypes';
import { RULE_SETS } from '../../../../shared/domain/inspection/ruleSets';
import type { Verdict } from '../../../../shared/domain/inspection/severity';
import type { CreateInspectionResponse, Inspection } from '../../../../shared/schemas/inspection';
import type { Sling } from '../../../../shared/schemas/slings';
import { Band } from '../../../components/sling/Band';
import { Panel } from '../../../components/ui/Panel';
import { STATE_FACTS } from '../../../../shared/domain/lifecycle/states';
import { cx } from '../../../lib/cx';
import { formatCount, formatDate, formatDateWithDistance } from '../../../lib/format';
import { VERDICT_TONES, VERDICT_WORDS } from '../verdictWords';
import { FindingList } from './FindingList';
import { VerdictMark } from './VerdictMark';

/** What came out, what the sling is now, and (as `next`) what to do with it. */
export function InspectionResult({
  answer: { inspection, sling },
  next,
}: {
  answer: CreateInspectionResponse;
  next: ReactNode;
}): ReactNode {
  const { verdict, type } = inspection;
  return (
    <div className="flex flex-col gap-6">
      <section
        role="status"
        aria-label="Verdict"
        className={cx(
          'flex flex-wrap items-center gap-x-5 gap-y-2 rounded-[14px] border-2 px-5 py-5',
          VERDICT_TONES[verdict],
        )}
      >
        <VerdictMark verdict={verdict} className="size-14 shrink-0" />
        <div className="min-w-0 flex-1 basis-56">
          <h2 className="text-[2.75rem] leading-none font-bold tracking-[0.01em]">
            {VERDICT_WORDS[verdict].word}
          </h2>
          <p className="mt-1.5 text-lg leading-snug font-semibold text-ink">
            {VERDICT_WORDS[verdict].means} {INSPECTION_TYPE_FACTS[type].name} of{' '}
            {formatDate(inspection.inspectedOn)} by {inspection.inspector.name}.
          </p>
          {inspection.nextDueOn && (
            <p className="text-lg font-semibold text-ink">
              Next due {formatDateWithDistance(inspection.nextDueOn)}.
            </p>
          )}
        </div>
      </section>
      <Band sling={sling}>{sayNow(sling, verdict)}</Band>
      {next}
      <Panel title="Findings" aside={formatCount(inspection.findings.length, 'finding')}>
        <FindingList inspection={inspection} fittings={sling.fittings} />
      </Panel>
      <MadeWith inspection={inspection} />
    </div>
  );
}

/** What the sling is now. A pass alone puts nothing into service: that is an act of its own. */
function sayNow({ state }: Sling, verdict: Verdict): string {
  if (verdict === 'pass') {
    if (state === 'received') return 'It passed. It is not used before it is accepted.';
    if (state === 'held') return 'It passed. It is not used before it is released.';
    if (state === 'returned') return 'It passed. It is not used before it is returned to service.';
  }
  return STATE_FACTS[state].meaning;
}

/** The rule sets that the verdict was made with, and what was left out of it. */
function MadeWith({ inspection }: { inspection: Inspection }): ReactNode {
  const { ruleSets, notTaken } = inspection;
  const names = notTaken.map(({ criterionId }) => findCriterion(criterionId)?.name ?? criterionId);
  return (
    <div className="border-t border-rule pt-3 text-[0.9375rem] text-muted">
      <p>Made with {ruleSets.map(({ id, edition }) => `${RULE_SETS[id].name} (${edition})`).join('; ')}.</p>
      {names.length > 0 && <p>Measurements not taken: {names.join(', ')}.</p>}
    </div>
  );
}
