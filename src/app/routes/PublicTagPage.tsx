import { useState, type ReactNode } from 'react';
import { Link, useParams } from 'react-router-dom';
import { parseTagCode } from '../../../shared/domain/tags/tagCode';
import { ScanAnswer } from '../../components/sling/ScanAnswer';
import { usePageTitle } from '../../components/ui/PageHeader';
import { Skeleton } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { usePublicTag } from '../../features/publicPage/api/getPublicTag';
import { ReportPanel } from '../../features/publicPage/components/ReportPanel';
import { TagAnswer } from '../../features/publicPage/components/TagAnswer';
import { TagFacts } from '../../features/publicPage/components/TagFacts';
import { formatTagCode } from '../../lib/format';

/** What a label's code opens on anybody's phone. No session, no shell, and as little to load as can be. */
export function Component(): ReactNode {
  const { code = '' } = useParams();
  const query = usePublicTag(code);
  const [sent, setSent] = useState<string | null>(null);
  const tag = query.data;
  usePageTitle(sent || tag?.verdict === 'do_not_use' ? 'Do not use' : 'Sling');
  if (query.isPending) return <Waiting />;
  // A label of ours that is void or unknown can still be reported; a code that is none of ours can't
  const isOurs = parseTagCode(code).ok;
  return (
    <main className="min-h-dvh pb-10">
      <h1 className="sr-only">Label {formatTagCode(code)}</h1>
      {sent === null ? (
        <TagAnswer
          tag={query.error ? undefined : tag}
          error={query.error}
          onRetry={() => void query.refetch()}
        />
      ) : (
        <ScanAnswer
          mayUse={false}
          title={tag?.number ? 'This sling is now held. Do not use it. Give it to the store.' : sent}
          lines={['Your report was received. Thank you.']}
        />
      )}
      <div className="mx-auto flex max-w-2xl flex-col gap-6 px-4 pt-5 sm:px-8">
        {sent === null && isOurs && (
          <ReportPanel
            code={code}
            onSent={(message) => {
              setSent(message);
              void query.refetch();
            }}
          />
        )}
        {tag && <TagFacts tag={tag} />}
        <Caution code={code} />
      </div>
    </main>
  );
}

function Caution({ code }: { code: string }): ReactNode {
  return (
    <footer className="flex flex-col gap-2 border-t border-rule pt-4 text-[0.9375rem] text-muted">
      <p>
        A record-keeping and planning aid. It does not replace inspection by a competent or qualified person,
        the maker’s instructions, or local codes.
      </p>
      <p className="flex flex-wrap items-center justify-between gap-x-4">
        <span>
          Label <code className="font-mono tracking-wider">{formatTagCode(code)}</code>
        </span>
        <Link
          to={paths.scan(code)}
          className="inline-flex min-h-target items-center font-semibold text-petrol underline underline-offset-4"
        >
          For store staff: open its record
        </Link>
      </p>
    </footer>
  );
}

function Waiting(): ReactNode {
  return (
    <main>
      <h1 className="sr-only">Looking the label up</h1>
      <p role="status" className="sr-only">
        Looking the label up
      </p>
      <Skeleton className="h-[50dvh] w-full rounded-none!" />
      <div className="mx-auto max-w-2xl px-4 pt-5 sm:px-8">
        <Skeleton className="h-16 w-full" />
      </div>
    </main>
  );
}
