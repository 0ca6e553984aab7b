const DAY_MS = 86_400_000;
const HOUR_MS = 3_600_000;

/** Moments of the story, counted back from the day on which it is loaded. */
export interface DemoClock {
  /** UTC, at a time of day when it is the same date in London. */
  at: (daysAgo: number, hour: number, minute?: number) => Date;
  /** Back from the last full hour: for what has just happened. */
  hoursAgo: (hours: number) => Date;
  /** YYYY-MM-DD; days ahead are negative. */
  dayOf: (daysAgo: number) => string;
}

export function createClock(now: Date): DemoClock {
  const midnight = Math.floor(now.getTime() / DAY_MS) * DAY_MS;
  const lastHour = Math.floor(now.getTime() / HOUR_MS) * HOUR_MS;
  return {
    at: (daysAgo, hour, minute = 0) =>
      new Date(midnight - daysAgo * DAY_MS + hour * HOUR_MS + minute * 60_000),
    hoursAgo: (hours) => new Date(lastHour - hours * HOUR_MS),
    dayOf: (daysAgo) => new Date(midnight - daysAgo * DAY_MS).toISOString().slice(0, 10),
  };
}
