import { useState, type ReactNode } from 'react';
import { Button } from '../../../../components/ui/Button';
import { SelectField } from '../../../../components/ui/inputs';
import { cx } from '../../../../lib/cx';
import { useSites } from '../../../../lib/places';
import type { RegisterFilters } from '../../hooks/useRegisterFilters';
import { toOptions } from '../../form/options';
import {
  CONDEMNED_OPTIONS,
  CUSTODY_OPTIONS,
  DUE_OPTIONS,
  KIND_OPTIONS,
  LABEL_OPTIONS,
  SECURED_OPTIONS,
  SORT_NAMES,
  STATE_OPTIONS,
} from './filterOptions';
import { SearchField } from './SearchField';

/** Search, and the filters: folded away on a phone, always open on a desk. */
export function FilterPanel({ register }: { register: RegisterFilters }): ReactNode {
  const { filters, activeCount, setFilter, clear } = register;
  const [isOpen, setIsOpen] = useState(false);
  return (
    <section aria-label="Search and filters" className="no-print mb-4 flex flex-col gap-3">
      <div className="flex items-end gap-3">
        <SearchField value={filters.q ?? ''} onSearch={(q) => setFilter('q', q)} />
        <Button
          tone="quiet"
          className="shrink-0 lg:hidden"
          aria-expanded={isOpen}
          aria-controls="register-filters"
          onClick={() => setIsOpen(!isOpen)}
        >
          Filters{activeCount > 0 && ` (${activeCount})`}
        </Button>
      </div>
      <div
        id="register-filters"
        className={cx(
          'grid grid-cols-2 gap-3 sm:grid-cols-3 lg:grid lg:grid-cols-4 xl:grid-cols-7',
          !isOpen && 'hidden',
        )}
      >
        <FilterSelects register={register} />
      </div>
      {activeCount > 0 && (
        <div className="flex flex-wrap items-center justify-between gap-x-4">
          <p className="text-muted">
            {activeCount === 1 ? '1 filter is set.' : `${activeCount} filters are set.`}
          </p>
          <Button tone="plain" onClick={clear}>
            Show all slings
          </Button>
        </div>
      )}
    </section>
  );
}

function FilterSelects({ register }: { register: RegisterFilters }): ReactNode {
  const { filters, setFilter } = register;
  const sites = useSites().data?.items ?? [];
  const asksQuarantine =
    filters.state === 'held' || filters.secured !== undefined || filters.condemned !== undefined;
  const select = (
    name: Parameters<typeof setFilter>[0],
    label: string,
    options: readonly { value: string; label: string }[],
  ): ReactNode => (
    <SelectField
      label={label}
      placeholder="Any"
      options={options}
      value={String(filters[name] ?? '')}
      onChange={(event) => setFilter(name, event.target.value)}
    />
  );
  return (
    <>
      {select('state', 'State', STATE_OPTIONS)}
      {asksQuarantine && select('secured', 'Secured', SECURED_OPTIONS)}
      {asksQuarantine && select('condemned', 'Decision', CONDEMNED_OPTIONS)}
      {select('kind', 'Kind', KIND_OPTIONS)}
      {(sites.length > 1 || filters.siteId !== undefined) &&
        select(
          'siteId',
          'Site',
          sites.map(({ id, name }) => ({ value: String(id), label: name })),
        )}
      {select('due', 'Inspection', DUE_OPTIONS)}
      {select('custody', 'Whereabouts', CUSTODY_OPTIONS)}
      {select('label', 'Label', LABEL_OPTIONS)}
      <SelectField
        label="Order"
        options={toOptions(SORT_NAMES)}
        value={filters.sort ?? 'number'}
        onChange={(event) => setFilter('sort', event.target.value === 'number' ? '' : event.target.value)}
      />
    </>
  );
}
