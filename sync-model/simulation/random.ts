export type Random = {
  /** 0 ≤ x < 1. */
  next(): number;
  /** A whole number from 0 to below `count`. */
  below(count: number): number;
  chance(probability: number): boolean;
  pick<T>(items: readonly T[]): T;
  /** One of the names, each as likely as its weight says. */
  weighted<T extends string>(weights: Readonly<Record<T, number>>): T;
};

/** A small seeded generator (mulberry32): the same seed gives the same run. */
export function randomFrom(seed: number): Random {
  let state = Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b) >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
  const below = (count: number) => Math.floor(next() * count);
  return {
    next,
    below,
    chance: (probability) => next() < probability,
    pick: <T>(items: readonly T[]) => {
      const item = items[below(items.length)];
      if (item === undefined) throw new Error('nothing to pick from');
      return item;
    },
    weighted: <T extends string>(weights: Readonly<Record<T, number>>) => {
      const entries = Object.entries(weights) as [T, number][];
      let left = next() * entries.reduce((sum, [, weight]) => sum + weight, 0);
      for (const [name, weight] of entries) {
        left -= weight;
        if (left < 0) return name;
      }
      return entries[0]![0];
    },
  };
}
