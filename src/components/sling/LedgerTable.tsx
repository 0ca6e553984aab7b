import { useState, type ReactNode } from 'react';
import { fileUrl } from '../../config/paths';
import { formatShortTime } from '../../lib/format';

export interface LedgerLine {
  key: string | number;
  /** Instant of the act, by the server's clock. */
  at: string;
  who: string;
  /** What was done, in one line. */
  what: ReactNode;
  /** Reasons, notes, from and to. */
  more?: ReactNode;
  /** Photos and papers of the act. */
  evidenceFileIds?: readonly string[];
}

/** History as a ruled ledger page: time, who, what, evidence. */
export function LedgerTable({
  lines,
  timeZone,
}: {
  lines: readonly LedgerLine[];
  timeZone?: string;
}): ReactNode {
  const now = new Date();
  return (
    <div className="overflow-x-auto">
      <table className="w-full border-collapse border-y-2 border-ink text-left">
        <caption className="sr-only">Ledger</caption>
        <thead className="max-sm:sr-only">
          <tr className="text-[0.9375rem] text-muted">
            <th scope="col" className="w-32 py-2 pr-3 font-semibold">
              When
            </th>
            <th scope="col" className="w-44 border-l border-rule px-3 py-2 font-semibold">
              Who
            </th>
            <th scope="col" className="border-l border-rule px-3 py-2 font-semibold">
              What
            </th>
            <th scope="col" className="w-40 border-l border-rule py-2 pl-3 font-semibold">
              Evidence
            </th>
          </tr>
        </thead>
        <tbody>
          {lines.map((line) => (
            <tr
              key={line.key}
              className="border-t border-rule align-top max-sm:grid max-sm:grid-cols-[5.5rem_1fr] max-sm:py-2"
            >
              <td className="py-2 pr-3 text-muted max-sm:row-span-3 max-sm:border-r max-sm:border-danger/40 max-sm:py-0">
                <time dateTime={line.at}>{formatShortTime(line.at, now, timeZone)}</time>
              </td>
              <td className="px-3 py-2 text-muted max-sm:order-2 max-sm:py-0 sm:border-l sm:border-rule sm:text-ink">
                {line.who}
              </td>
              <td className="px-3 py-2 max-sm:order-1 max-sm:py-0 sm:border-l sm:border-rule">
                <span className="font-medium">{line.what}</span>
                {line.more && <div className="text-[0.9375rem] text-muted">{line.more}</div>}
              </td>
              <td className="px-3 py-2 max-sm:order-3 max-sm:py-0 sm:border-l sm:border-rule">
                <Evidence ids={line.evidenceFileIds ?? []} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Evidence({ ids }: { ids: readonly string[] }): ReactNode {
  if (ids.length === 0) return null;
  return (
    <ul className="flex flex-wrap gap-2 max-sm:mt-1.5">
      {ids.map((id, i) => (
        <li key={id}>
          <EvidenceThumb id={id} name={`Evidence ${i + 1}`} />
        </li>
      ))}
    </ul>
  );
}

/** A picture shows itself; a paper (PDF), which an image can't show, its word. */
function EvidenceThumb({ id, name }: { id: string; name: string }): ReactNode {
  const [isPaper, setIsPaper] = useState(false);
  return (
    <a
      href={fileUrl(id)}
      target="_blank"
      rel="noreferrer"
      className="grid size-12 place-items-center overflow-hidden rounded border border-edge bg-wash text-[0.875rem] font-semibold text-ink"
    >
      {isPaper ? (
        <>
          PDF<span className="sr-only">: {name}</span>
        </>
      ) : (
        <img
          src={fileUrl(id)}
          alt={name}
          className="size-full object-cover"
          onError={() => setIsPaper(true)}
        />
      )}
    </a>
  );
}
