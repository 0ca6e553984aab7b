import { useInfiniteQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import type { SlingSummary } from '../../../../shared/schemas/slings';
import { LIMITS } from '../../../../shared/limits';
import { Button, LinkButton } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { Panel } from '../../../components/ui/Panel';
import { Segments } from '../../../components/ui/Segments';
import { EmptyState, ErrorState, SkeletonLines } from '../../../components/ui/states';
import { paths } from '../../../config/paths';
import { choosableQuery, LABEL_VIEWS, type LabelView } from '../api/findChoosable';
import type { LabelChoice } from '../hooks/useLabelChoice';
import { SlingTick } from './SlingTick';

const VIEW_NAMES: Record<LabelView, string> = {
  none: 'Without a label',
  printed: 'Printed, to confirm',
  live: 'With a label',
};

/** Step 1: which slings. */
export function SlingChooser({ choice }: { choice: LabelChoice }): ReactNode {
  const { view, search, slingIds, setSlingIds } = choice;
  const list = useInfiniteQuery(choosableQuery(view, search));
  const rows = list.data?.pages.flatMap((page) => page.items) ?? [];
  const isAllChosen = rows.length > 0 && rows.every(({ id }) => slingIds.includes(id));
  const toggle = (id: number): void =>
    setSlingIds(slingIds.includes(id) ? slingIds.filter((other) => other !== id) : [...slingIds, id]);
  const toggleAll = (): void => {
    const shown = rows.map(({ id }) => id);
    setSlingIds(
      isAllChosen
        ? slingIds.filter((id) => !shown.includes(id))
        : [...new Set([...slingIds, ...shown])].slice(0, LIMITS.labelsPerRun),
    );
  };

  return (
    <Panel title="1. Choose the slings">
      <Segments
        label="Slings by their label"
        segments={LABEL_VIEWS.map((other) => ({
          to: choice.viewAddress(other),
          label: VIEW_NAMES[other],
          isCurrent: other === view,
        }))}
      />
      <div className="flex flex-wrap items-end gap-3 py-3">
        <SearchField key={view} search={search} onSearch={choice.setSearch} />
        {rows.length > 0 && (
          <Button tone="quiet" onClick={toggleAll}>
            {isAllChosen ? 'Take back all shown' : `Choose all ${rows.length} shown`}
          </Button>
        )}
      </div>
      {list.isPending && <SkeletonLines lines={6} />}
      {list.error && <ErrorState error={list.error} onRetry={() => void list.refetch()} />}
      {list.data && rows.length === 0 && <NothingHere view={view} search={search} />}
      <ul className="max-h-[34rem] overflow-y-auto border-b border-rule">
        {rows.map((sling: SlingSummary) => (
          <SlingTick
            key={sling.id}
            sling={sling}
            isChosen={slingIds.includes(sling.id)}
            onToggle={() => toggle(sling.id)}
          />
        ))}
      </ul>
      {list.hasNextPage && (
        <Button
          tone="plain"
          className="mt-2"
          pending={list.isFetchingNextPage}
          pendingText="Loading"
          onClick={() => void list.fetchNextPage()}
        >
          Show more
        </Button>
      )}
    </Panel>
  );
}

function SearchField({ search, onSearch }: { search: string; onSearch: (text: string) => void }): ReactNode {
  const [text, setText] = useState(search);
  return (
    <form
      role="search"
      className="flex min-w-60 flex-1 items-end gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        onSearch(text.trim());
      }}
    >
      <TextField
        className="flex-1"
        label="Search"
        type="search"
        placeholder="Number, serial, lot, maker"
        maxLength={LIMITS.shortText}
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          if (event.target.value === '') onSearch('');
        }}
      />
      <Button type="submit" tone="quiet">
        Search
      </Button>
    </form>
  );
}

function NothingHere({ view, search }: { view: LabelView; search: string }): ReactNode {
  if (search) {
    return (
      <EmptyState title="None found">
        Nothing here matches “{search}”. Clear the search, or look in the other lists.
      </EmptyState>
    );
  }
  if (view === 'none') {
    return (
      <EmptyState
        title="Every sling has a label"
        action={
          <LinkButton tone="quiet" to={paths.newSling}>
            Register a sling
          </LinkButton>
        }
      >
        New slings show up here until their label is printed. To replace a label, choose the sling from the
        other lists.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title={view === 'printed' ? 'No label waits to be confirmed' : 'No sling has a live label yet'}
    >
      {view === 'printed'
        ? 'Labels that were printed and not yet scanned on their sling show up here.'
        : 'A label becomes live when it is scanned on its sling and the sling’s last four characters are typed.'}
    </EmptyState>
  );
}
