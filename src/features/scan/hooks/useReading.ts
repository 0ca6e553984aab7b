import { useCallback } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { readingSchema, type Reading } from '../reading';

const entryState = z.object({ reading: readingSchema });

/** The scan that is being answered, kept with the history entry: Back from a record shows its answer again. */
export function useReading(): { reading: Reading | null; setReading: (reading: Reading | null) => void } {
  const location = useLocation();
  const { pathname } = location;
  const state: unknown = location.state;
  const navigate = useNavigate();
  const parsed = entryState.safeParse(state);
  const setReading = useCallback(
    (reading: Reading | null) =>
      void navigate(pathname, { replace: true, state: reading ? { reading } : null }),
    [navigate, pathname],
  );
  return { reading: parsed.success ? parsed.data.reading : null, setReading };
}
