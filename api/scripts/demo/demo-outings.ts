import type { DemoGround } from './demo-ground.js';
import { logChanceFind, logTarget, type Outing } from './demo-entries.js';
import { DEMO_PEOPLE, type DemoPerson } from './demo-people.js';
import { DEMO_PLACES } from './demo-places.js';
import { DEMO_TARGETS } from './demo-targets.js';
import type { DemoWriter } from './demo-writer.js';
import type { SeededRandom } from './seeded-random.js';

/** The hidden chance behind one reception that is a try, for the test of the intervals. */
export type TrueChance = ReadonlyMap<string, number>;

const SEASON_FROM = Date.UTC(2026, 7, 1);
const SEASON_DAYS = 120;
const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;
/** Birger checks his clock only from here on. */
const CLOCK_CHECKED_FROM = Date.UTC(2026, 10, 1);
/** Start hours as the club really goes out: evenings, some early mornings, a few noons. */
const START_HOURS_UTC = [3, 4, 5, 6, 9, 11, 13, 14, 15, 15, 16, 16, 17, 17, 18, 18, 19, 20, 21];

/** Four months of outings of everybody; returns the true chance of each try by its reception's id. */
export function addDemoOutings(
  writer: DemoWriter,
  ground: DemoGround,
  random: SeededRandom,
  people: readonly DemoPerson[],
): TrueChance {
  const chances = new Map<string, number>();
  for (const person of people) {
    for (let n = 0; n < person.outings; n++) {
      const day = Math.min(SEASON_DAYS - 1, Math.floor(((n + random.unit()) / person.outings) * SEASON_DAYS));
      const startedAt =
        SEASON_FROM + day * DAY_MS + random.pick(START_HOURS_UTC) * HOUR_MS + random.whole(0, 40) * 60_000;
      const outing = addOuting(writer, ground, random, person, startedAt);
      logOuting(writer, ground, random, outing, chances);
    }
  }
  return chances;
}

function addOuting(
  writer: DemoWriter,
  ground: DemoGround,
  random: SeededRandom,
  person: DemoPerson,
  trueStart: number,
): Outing {
  const endedAt = trueStart + random.whole(150, 280) * 60_000;
  const site = favouriteSite(random, person);
  const setupIds = person.antennas.map((antenna) => ground.setupId(person, antenna));
  const device = (at: number) => at - person.clockOffsetMs;
  const outingId = writer.add(person, 'outing', trueStart, {
    siteId: ground.siteIds[site]!,
    startedAt: device(trueStart),
    ended: { at: device(endedAt), by: 'hand' },
    targetListId: ground.listId,
    setupIds,
    currentSetupId: setupIds[0]!,
    eventId: null,
    clockSteps: [],
    notes: null,
  });
  if (person.clockOffsetMs === 0 || trueStart >= CLOCK_CHECKED_FROM) {
    writer.add(person, 'clock-check', trueStart + 1, {
      deviceId: person.deviceId,
      deviceAt: device(trueStart),
      offsetMs: person.clockOffsetMs + random.whole(-250, 250),
      uncertaintyMs: 300,
      method: 'tone',
      pathKm: 1100,
    });
  }
  return { person, site, outingId, setupIds, startedAt: trueStart, endedAt };
}

/** Everybody has five places of their own taste, so that sites differ in how well they are known. */
function favouriteSite(random: SeededRandom, person: DemoPerson): number {
  return (DEMO_PEOPLE.indexOf(person) * 11 + random.whole(0, 4) * 7) % DEMO_PLACES.length;
}

function logOuting(
  writer: DemoWriter,
  ground: DemoGround,
  random: SeededRandom,
  outing: Outing,
  chances: Map<string, number>,
): void {
  let at = outing.startedAt + random.whole(2, 9) * 60_000;
  for (let roundNo = 1; at < outing.endedAt - 15 * 60_000; roundNo++) {
    const arm = (roundNo - 1) % outing.setupIds.length;
    for (let target = 0; target < DEMO_TARGETS.length; target++) {
      at += random.whole(45, 100) * 1000;
      logTarget(writer, ground, random, outing, { target, arm, roundNo, at }, chances);
    }
    if (random.unit() < 0.5) logChanceFind(writer, ground, random, outing, arm, at + 20_000);
    at += random.whole(14, 24) * 60_000;
  }
}
