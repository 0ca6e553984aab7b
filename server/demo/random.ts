/** A repeatable source of choices: the same seed always tells the same story. */
export interface Random {
  /** From 0 up to, never including, 1. */
  next: () => number;
  /** A whole number, both ends included. */
  int: (least: number, most: number) => number;
  pick: <T>(items: readonly T[]) => T;
  shuffle: <T>(items: readonly T[]) => T[];
  bytes: (count: number) => Uint8Array;
}

/** Mulberry32, a published 32-bit generator: fine for stories, never for secrets. */
export function createRandom(seed: number): Random {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const int = (least: number, most: number): number => least + Math.floor(next() * (most - least + 1));
  return {
    next,
    int,
    pick(items) {
      const item = items[int(0, items.length - 1)];
      if (item === undefined) throw new Error('There is nothing to choose from.');
      return item;
    },
    shuffle(items) {
      return items
        .map((item) => ({ item, place: next() }))
        .sort((a, b) => a.place - b.place)
        .map(({ item }) => item);
    },
    bytes: (count) => Uint8Array.from({ length: count }, () => int(0, 255)),
  };
}
