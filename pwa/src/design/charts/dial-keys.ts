/** A cell of a dial by its ring, from the middle, and its UTC hour. */
export type CellAt = { readonly ring: number; readonly hour: number };

/** Where an arrow key leads from a cell: round the clock, and not beyond the first and last ring. Null for other keys. */
export function steppedCell(from: CellAt | null, key: string, rings: number): CellAt | null {
  if (rings === 0 || !(key in STEPS)) return null;
  if (!from) return { ring: rings - 1, hour: 12 };
  const [hours, ring] = STEPS[key]!;
  return {
    ring: Math.max(0, Math.min(rings - 1, from.ring + ring)),
    hour: (from.hour + hours + 24) % 24,
  };
}

const STEPS: Readonly<Record<string, readonly [hours: number, rings: number]>> = {
  ArrowRight: [1, 0],
  ArrowLeft: [-1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};
