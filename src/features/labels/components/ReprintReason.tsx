import type { ReactNode } from 'react';
import { REPRINT_REASON_FACTS, REPRINT_REASONS, type ReprintReason } from '../../../../shared/schemas/labels';
import type { SlingSummary } from '../../../../shared/schemas/slings';
import { Panel } from '../../../components/ui/Panel';
import { RadioTiles } from '../../../components/ui/Tiles';
import { formatCount } from '../../../lib/format';

/** Asked only when a chosen sling has a printed or live label already. */
export function ReprintReasonPanel({
  labelled,
  reason,
  onChoose,
}: {
  labelled: readonly SlingSummary[];
  reason: ReprintReason | null;
  onChoose: (reason: ReprintReason) => void;
}): ReactNode {
  return (
    <Panel title="Why print again?">
      <p className="mb-3">
        {formatCount(labelled.length, 'of the chosen slings has', 'of the chosen slings have')} a label
        already: {listNumbers(labelled)}. One label lives on a sling at a time.
      </p>
      <RadioTiles
        legend="Reason"
        hideLegend
        options={REPRINT_REASONS.map((value) => ({
          value,
          label: REPRINT_REASON_FACTS[value].name,
          hint: REPRINT_REASON_FACTS[value].voidsAtOnce
            ? 'The old label is void at once.'
            : 'The old label stays good until the new one is confirmed.',
        }))}
        input={{
          name: 'reason',
          onChange: (event) => {
            const chosen = REPRINT_REASONS.find((known) => known === event.target.value);
            if (chosen) onChoose(chosen);
          },
        }}
        selected={reason ? [reason] : []}
      />
    </Panel>
  );
}

function listNumbers(slings: readonly SlingSummary[]): string {
  const shown = slings.slice(0, 5).map(({ number }) => number);
  const more = slings.length - shown.length;
  return shown.join(', ') + (more > 0 ? ` and ${more} more` : '');
}
