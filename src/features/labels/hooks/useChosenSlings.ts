import { useQueries } from '@tanstack/react-query';
import type { SlingSummary } from '../../../../shared/schemas/slings';
import { chosenSlingQuery } from '../api/findChoosable';

/** Chosen slings that no page here holds are fetched one by one; beyond this many they are only counted. */
const MOST_FETCHED = 40;

export interface ChosenSlings {
  known: readonly SlingSummary[];
  /** Chosen, but not looked at; the server still checks each. */
  unknownCount: number;
  isPending: boolean;
  error: Error | null;
}

/** @param listed the slings on the pages fetched so far */
export function useChosenSlings(ids: readonly number[], listed: readonly SlingSummary[]): ChosenSlings {
  const byId = new Map(listed.map((sling) => [sling.id, sling] as const));
  const missing = ids.filter((id) => !byId.has(id)).slice(0, MOST_FETCHED);
  const fetched = useQueries({ queries: missing.map(chosenSlingQuery) });
  for (const { data } of fetched) if (data) byId.set(data.id, data);
  const known = ids.map((id) => byId.get(id)).filter((sling) => sling !== undefined);
  return {
    known,
    unknownCount: ids.length - known.length,
    isPending: fetched.some((query) => query.isPending),
    error: fetched.find((query) => query.error)?.error ?? null,
  };
}
