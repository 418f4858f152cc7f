/** A small seeded generator (mulberry32, public domain): the demo is the same on every machine. */
export type SeededRandom = {
  /** 0 ≤ x < 1 */
  unit(): number;
  /** Whole number from `low` to `high`, both possible. */
  whole(low: number, high: number): number;
  pick<T>(list: readonly T[]): T;
  /** Normal deviate, mean 0 and deviation 1 (Box–Muller). */
  normal(): number;
  bytes(length: number): Uint8Array;
};

export function createSeededRandom(seed: number): SeededRandom {
  let state = seed >>> 0;
  const unit = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
  const whole = (low: number, high: number) => low + Math.floor(unit() * (high - low + 1));
  return {
    unit,
    whole,
    pick: (list) => list[whole(0, list.length - 1)]!,
    normal: () => Math.sqrt(-2 * Math.log(1 - unit())) * Math.cos(2 * Math.PI * unit()),
    bytes: (length) => Uint8Array.from({ length }, () => whole(0, 255)),
  };
}
