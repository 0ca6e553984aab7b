import type { ReactNode } from 'react';
import { findCriterion } from '../../../../shared/domain/inspection/catalogue';
import { SOURCE_MARK_WORDS, type Speech } from '../../../../shared/domain/inspection/criterion';
import { RULE_SETS } from '../../../../shared/domain/inspection/ruleSets';
import type { Finding } from '../../../../shared/domain/inspection/verdict';
import type { Inspection } from '../../../../shared/schemas/inspection';
import type { Sling } from '../../../../shared/schemas/slings';
import { nameFitting } from '../rowGroups';
import { VERDICT_WORDS } from '../verdictWords';

const OUTCOME_WORDS = {
  note: 'Note',
  refer: VERDICT_WORDS.refer.word,
  reject: VERDICT_WORDS.reject.word,
} as const;
const SPEECH_WORDS = {
  note: 'a note',
  refer: 'refer',
  reject: 'reject',
  pass: 'pass',
  silent: 'says nothing',
} as const satisfies Record<Speech, string>;

/** Every finding with what it leads to, its source and clause, and what the other rule sets say. */
export function FindingList({
  inspection,
  fittings,
}: {
  inspection: Inspection;
  fittings: Sling['fittings'];
}): ReactNode {
  const { findings, stricter } = inspection;
  if (findings.length === 0 && !stricter) return <p>Nothing was found.</p>;
  return (
    <ul className="divide-y divide-rule">
      {stricter && (
        <li className="py-3">
          <p className="font-semibold">The inspector was stricter: {VERDICT_WORDS[stricter.verdict].word}</p>
          <p className="break-words whitespace-pre-line">{stricter.note}</p>
        </li>
      )}
      {findings.map((finding) => (
        <li key={`${finding.criterionId}#${finding.fittingId ?? ''}`} className="py-3">
          <p className="font-semibold">
            {findCriterion(finding.criterionId)?.name ?? finding.criterionId}
            {finding.fittingId !== undefined && ` (${nameFitting(finding.fittingId, fittings)})`}:{' '}
            {OUTCOME_WORDS[finding.outcome]}
          </p>
          <Figures finding={finding} />
          <Sources finding={finding} />
        </li>
      ))}
    </ul>
  );
}

function Figures({ finding: { value, limit, unit } }: { finding: Finding }): ReactNode {
  if (value === null) return null;
  const sign = unit ?? '';
  return (
    <p>
      {value} {sign}
      {limit !== null && `, limit ${limit} ${sign}`}
    </p>
  );
}

function Sources({ finding }: { finding: Finding }): ReactNode {
  const { ruleSet, edition, sources, others, isFromOtherSet } = finding;
  const clauses = sources.map(
    ({ document, clause, mark }) => `${document} ${clause} (${SOURCE_MARK_WORDS[mark]})`,
  );
  return (
    <div className="text-[0.9375rem] text-muted">
      <p>
        {RULE_SETS[ruleSet].name}, {edition}
        {clauses.length > 0 && `: ${clauses.join('; ')}`}.
        {isFromOtherSet && ' The rule sets in use at this site say nothing on it, so another one counts.'}
      </p>
      {others.length > 0 && (
        <p>
          Others:{' '}
          {others
            .map(({ ruleSet: id, outcome }) => `${RULE_SETS[id].name}: ${SPEECH_WORDS[outcome]}`)
            .join('; ')}
          .
        </p>
      )}
    </div>
  );
}
