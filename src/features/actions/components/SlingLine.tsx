import type { ReactNode } from 'react';
import { describeSling } from '../../../../shared/domain/slings/describe';
import type { Sling } from '../../../../shared/schemas/slings';
import { StateMark } from '../../../components/sling/StateMark';

/** Which sling this is about, so that nobody acts on its twin: number, kind, serial, state. */
export function SlingLine({ sling }: { sling: Sling }): ReactNode {
  return (
    <div className="mb-5 flex flex-wrap items-center justify-between gap-x-6 gap-y-1.5 rounded-lg border border-plate-edge plate-face px-4 py-3 text-plate-ink">
      <div className="min-w-0">
        <p className="text-xl font-bold break-words">{sling.number}</p>
        <p className="text-plate-muted">
          {describeSling(sling)}
          {sling.makerSerial && (
            <>
              , serial{' '}
              <span className="inline-block max-w-full font-medium break-words text-plate-ink">
                {sling.makerSerial}
              </span>
            </>
          )}
        </p>
      </div>
      <StateMark sling={sling} />
    </div>
  );
}
