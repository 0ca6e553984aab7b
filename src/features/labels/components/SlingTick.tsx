import type { ReactNode } from 'react';
import { describeSling } from '../../../../shared/domain/slings/describe';
import type { SlingSummary } from '../../../../shared/schemas/slings';
import { StateMark } from '../../../components/sling/StateMark';

/** One line to tick; the whole line is the target. */
export function SlingTick({
  sling,
  isChosen,
  onToggle,
}: {
  sling: SlingSummary;
  isChosen: boolean;
  onToggle: () => void;
}): ReactNode {
  return (
    <li className="border-t border-rule">
      <label className="flex min-h-14 cursor-pointer items-center gap-3 px-2 py-2 has-checked:bg-petrol-wash">
        <input
          type="checkbox"
          checked={isChosen}
          onChange={onToggle}
          className="size-6 shrink-0 accent-petrol"
        />
        <span className="min-w-0 flex-1">
          <span className="font-semibold break-words">{sling.number}</span>
          <span className="block text-[0.9375rem] leading-snug text-muted">
            {describeSling(sling)}
            {sling.makerSerial && `, serial ${sling.makerSerial}`}
          </span>
        </span>
        <StateMark sling={sling} className="shrink-0 text-[0.9375rem]" />
      </label>
    </li>
  );
}
