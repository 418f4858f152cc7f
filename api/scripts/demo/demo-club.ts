import { addDemoGround, type DemoGround } from './demo-ground.js';
import { addDemoOutings, type TrueChance } from './demo-outings.js';
import { DEMO_PEOPLE } from './demo-people.js';
import { createDemoWriter, type DemoChange } from './demo-writer.js';
import { createSeededRandom } from './seeded-random.js';

export const DEMO_SEED = 20261201;

export type DemoClub = {
  readonly changes: readonly DemoChange[];
  readonly ground: DemoGround;
  readonly chances: TrueChance;
};

/** The whole Marram Radio Circle as its phones would send it; the same seed gives the same club. */
export function makeDemoClub(seed = DEMO_SEED): DemoClub {
  const random = createSeededRandom(seed);
  const writer = createDemoWriter(random);
  const ground = addDemoGround(writer);
  const chances = addDemoOutings(writer, ground, random, DEMO_PEOPLE);
  return { changes: writer.changes, ground, chances };
}
