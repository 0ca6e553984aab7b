import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { REPRINT_REASONS, type ReprintReason } from '../../../../shared/schemas/labels';
import { LIMITS } from '../../../../shared/limits';
import { LABEL_VIEWS, type LabelView } from '../api/findChoosable';

export interface LabelChoice {
  view: LabelView;
  search: string;
  slingIds: readonly number[];
  reason: ReprintReason | null;
  setSearch: (search: string) => void;
  setSlingIds: (ids: readonly number[]) => void;
  setReason: (reason: ReprintReason) => void;
  /** The address of another view with the same choice. */
  viewAddress: (view: LabelView) => string;
}

const isView = (value: string | null): value is LabelView => LABEL_VIEWS.some((view) => view === value);

/** Everything that was chosen stands in the address: it survives a reload and can be sent on. */
export function useLabelChoice(): LabelChoice {
  const [query, setQuery] = useSearchParams();
  const change = useCallback(
    (name: string, value: string) =>
      setQuery(
        (old) => {
          const next = new URLSearchParams(old);
          if (value) next.set(name, value);
          else next.delete(name);
          return next;
        },
        { replace: true },
      ),
    [setQuery],
  );
  const listed = query.get('slings') ?? '';
  const slingIds = useMemo(() => parseIds(listed), [listed]);
  const view = query.get('label');
  const reason = REPRINT_REASONS.find((known) => known === query.get('reason')) ?? null;
  return {
    view: isView(view) ? view : 'none',
    search: query.get('q') ?? '',
    slingIds,
    reason,
    setSearch: useCallback((search) => change('q', search), [change]),
    setSlingIds: useCallback((ids) => change('slings', ids.join(',')), [change]),
    setReason: useCallback((value) => change('reason', value), [change]),
    viewAddress: (other) => {
      const next = new URLSearchParams(query);
      next.delete('q');
      next.set('label', other);
      return `?${next.toString()}`;
    },
  };
}

function parseIds(text: string): number[] {
  const ids = text.split(',').filter((part) => /^[1-9]\d{0,14}$/.test(part));
  return [...new Set(ids.map(Number))].slice(0, LIMITS.labelsPerRun);
}
