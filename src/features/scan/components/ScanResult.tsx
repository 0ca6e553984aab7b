import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef, useState, type ReactNode } from 'react';
import { ScanAnswer } from '../../../components/sling/ScanAnswer';
import { Button } from '../../../components/ui/Button';
import { ErrorState } from '../../../components/ui/states';
import { TagCode } from '../../../components/ui/TagCode';
import { getToday } from '../../../lib/format';
import { ApiProblem } from '../../../lib/apiClient';
import { playScanTone } from '../../../lib/sounds';
import { tagQuery } from '../api/getTag';
import { composeAnswer } from '../answer';
import type { Reading } from '../reading';
import { FoundSling } from './FoundSling';
import { UnknownLabel } from './UnknownLabel';

/** The answer to one scan: asks the server, sounds, shows. */
export function ScanResult({ reading, onNext }: { reading: Reading; onNext: () => void }): ReactNode {
  const { data, error, refetch, isFetching } = useQuery(tagQuery(reading));
  const isUnknown = error instanceof ApiProblem && error.status === 404;
  const answer = data ? composeAnswer(data, getToday()) : null;
  useAnswerTone(reading, answer ? answer.mayUse : isUnknown ? false : null);

  if (data && answer) {
    return (
      <FullWidth band={<ScanAnswer {...answer} />}>
        <FoundSling found={data} via={reading.via} onNext={onNext} />
      </FullWidth>
    );
  }
  if (isUnknown) return <UnknownLabel reading={reading} onNext={onNext} Layout={FullWidth} />;
  if (error && !isFetching) {
    return (
      <div className="flex flex-col gap-4 pt-2">
        <ErrorState error={error} onRetry={() => void refetch()} />
        <p>
          The label <TagCode code={reading.code} /> was read, but the store did not say what it is. Until it
          does, don’t use the sling.
        </p>
        <Button onClick={onNext}>Scan next</Button>
      </div>
    );
  }
  return (
    <FullWidth
      band={
        <div
          role="status"
          className="flex min-h-[50dvh] flex-col justify-end bg-wash px-5.5 pt-8 pb-6 sm:px-8"
        >
          <p className="text-2xl font-bold">Label read</p>
          <p className="text-lg">
            Looking up <TagCode code={reading.code} />
          </p>
        </div>
      }
    >
      <div className="skeleton h-40 rounded-[14px]" aria-hidden="true" />
    </FullWidth>
  );
}

/** The band goes to the screen's edges on a phone; beside the details on wide screens. */
function FullWidth({ band, children }: { band: ReactNode; children: ReactNode }): ReactNode {
  return (
    <div className="lg:grid lg:grid-cols-2 lg:items-start lg:gap-8">
      <div className="-mx-4 -mt-7 sm:-mx-6 lg:mx-0 lg:mt-0 lg:overflow-hidden lg:rounded-[14px]">{band}</div>
      <div className="flex flex-col gap-4 pt-4 lg:pt-0">{children}</div>
    </div>
  );
}

/** The answer's part of the page is opened by the scan itself, some milliseconds after it. */
const FRESH_MS = 1500;

/** Sounds once per scan; an answer that Back brought up again stays silent. */
function useAnswerTone(reading: Reading, mayUse: boolean | null): void {
  const [openedAt] = useState(() => Date.now());
  const hasSounded = useRef(false);
  const isFresh = reading.readAt >= openedAt - FRESH_MS;
  useEffect(() => {
    if (mayUse === null || !isFresh || hasSounded.current) return;
    hasSounded.current = true;
    playScanTone(mayUse ? 'use' : 'stop');
  }, [mayUse, isFresh]);
}
