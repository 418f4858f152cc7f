import { rectOf } from './square-shapes';

export type Direction = 'left' | 'right' | 'up' | 'down';

const STEPS: Readonly<Record<Direction, readonly [number, number]>> = {
  left: [-1, 0],
  right: [1, 0],
  up: [0, -1],
  down: [0, 1],
};
/** How much a step to the side counts against one ahead: the cursor rather goes far than askew. */
const SIDEWAYS = 2;

const KEY_ACTS: Readonly<Record<string, Direction | 'open' | 'in' | 'out' | 'first'>> = {
  ArrowLeft: 'left',
  ArrowRight: 'right',
  ArrowUp: 'up',
  ArrowDown: 'down',
  Enter: 'open',
  '+': 'in',
  '=': 'in',
  '-': 'out',
  Home: 'first',
};

/** What a key does on the map; null where it does nothing. */
export function keyAct(key: string): Direction | 'open' | 'in' | 'out' | 'first' | null {
  return Object.hasOwn(KEY_ACTS, key) ? KEY_ACTS[key]! : null;
}

/**
 * The square with data that is next in a direction: the nearest of those ahead, a step aside counting double. The
 * cursor stays where nothing lies ahead, and comes to the first square, in the north-west, where it is nowhere yet.
 */
export function nextSquare(
  locators: readonly string[],
  from: string | null,
  direction: Direction,
): string | null {
  const start = from !== null && locators.includes(from) ? from : null;
  if (start === null) return firstSquare(locators);
  const here = centre(start);
  const [dx, dy] = STEPS[direction];
  let [best, bestCost] = [start, Infinity];
  for (const locator of locators) {
    const there = centre(locator);
    const [x, y] = [there.x - here.x, there.y - here.y];
    const ahead = x * dx + y * dy;
    if (locator === start || ahead <= 1e-12) continue;
    const cost = ahead + SIDEWAYS * Math.abs(x * dy + y * dx);
    if (cost < bestCost) [best, bestCost] = [locator, cost];
  }
  return best;
}

/** The north-western square. */
export function firstSquare(locators: readonly string[]): string | null {
  return locators.reduce<string | null>((best, locator) => {
    if (best === null) return locator;
    const [a, b] = [centre(locator), centre(best)];
    return a.y + a.x < b.y + b.x ? locator : best;
  }, null);
}

function centre(locator: string): { x: number; y: number } {
  const { x0, y0, x1, y1 } = rectOf(locator);
  return { x: (x0 + x1) / 2, y: (y0 + y1) / 2 };
}
