import { useEffect, useRef, useState, type ReactNode } from 'react';
import { LIMITS } from '../../../../../shared/limits';
import { Field, CONTROL } from '../../../../components/ui/Field';
import { useDebounced } from '../../hooks/useDebounced';

/** A rest in typing after which the list is asked for (common practice, no source). */
const REST_MS = 300;

/** Searches while typing; Enter searches at once. */
export function SearchField({
  value,
  onSearch,
}: {
  value: string;
  onSearch: (q: string) => void;
}): ReactNode {
  const [text, setText] = useState(value);
  const search = useDebounced((q) => onSearch(q.trim()), REST_MS);
  const lastSent = useRef(value);
  useEffect(() => {
    // The address changed otherwise (back, "Show all slings"): the field follows; never while it is behind the typing
    if (value !== lastSent.current) setText(value);
    lastSent.current = value;
  }, [value]);
  return (
    <form
      role="search"
      className="min-w-0 flex-1"
      onSubmit={(event) => {
        event.preventDefault();
        lastSent.current = text.trim();
        search.flush(text);
      }}
    >
      <Field label="Search" className="max-w-2xl">
        {(a11y) => (
          <input
            type="search"
            {...a11y}
            value={text}
            maxLength={LIMITS.shortText}
            autoComplete="off"
            placeholder="Number, serial, lot, maker, tag code"
            onChange={(event) => {
              setText(event.target.value);
              lastSent.current = event.target.value.trim();
              search.call(event.target.value);
            }}
            className={CONTROL}
          />
        )}
      </Field>
    </form>
  );
}
