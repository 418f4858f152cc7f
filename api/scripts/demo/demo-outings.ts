import { isOnAir } from '@harkmoor/sync-model/evidence/schedule';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { DEMO_ANTENNAS, DEMO_RECEIVERS } from './demo-gear.js';
import type { DemoGround } from './demo-ground.js';
import type { DemoPerson } from './demo-people.js';
import { DEMO_PLACES } from './demo-places.js';
import { demoMeter, demoSinpo } from './demo-signal.js';
import { DEMO_TARGETS } from './demo-targets.js';
import { trueHeardProbability } from './demo-truth.js';
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

type Outing = {
  person: DemoPerson;
  site: number;
  outingId: string;
  setupIds: string[];
  startedAt: number;
  endedAt: number;
};

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
  const base = person.key.length * 7 + person.receiver * 5 + person.antennas[0]! * 3;
  return (base + random.whole(0, 4) * 6) % DEMO_PLACES.length;
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

type Entry = { target: number; arm: number; roundNo: number; at: number };

function logTarget(
  writer: DemoWriter,
  ground: DemoGround,
  random: SeededRandom,
  outing: Outing,
  entry: Entry,
  chances: Map<string, number>,
): void {
  const { person } = outing;
  const target = DEMO_TARGETS[entry.target]!;
  const receiver = DEMO_RECEIVERS[person.receiver]!;
  if (
    !receiver.ranges.some(({ lowHz, highHz }) => target.frequencyHz >= lowHz && target.frequencyHz <= highHz)
  )
    return;
  const isOff = !isOnAir(target.schedule, entry.at, 0);
  if (isOff && !(person.isSloppy && random.unit() < 0.3)) return;
  if (!isOff && random.unit() < 0.05) return;
  const antenna = DEMO_ANTENNAS[person.antennas[entry.arm]!]!;
  const chance = isOff ? 0 : trueHeardProbability(target, antenna, entry.at);
  const isHeard = random.unit() < chance;
  const place = DEMO_PLACES[outing.site]!;
  const sinpo = isHeard ? demoSinpo(random, chance, place, person.isSloppy === true) : null;
  const id = writer.add(person, 'reception', entry.at, {
    ...emptyReception(outing, ground, entry.arm, entry.at),
    targetId: ground.targetIds[entry.target]!,
    targetHz: target.frequencyHz,
    roundNo: entry.roundNo,
    outcome: isHeard ? 'heard' : 'nil',
    basis: 'round',
    identity: isHeard && target.frequencyHz < 9_000_000 && random.unit() < 0.03 ? 'tentative' : 'sure',
    nilReason: isHeard || random.unit() < 0.8 ? null : random.pick(['nothing', 'noise', 'covered'] as const),
    tuning: { dialHz: target.frequencyHz, mode: target.mode },
    sinpo,
    ...(sinpo ? demoMeter(random, receiver, antenna, place, sinpo.s) : {}),
  });
  if (!isOff) chances.set(id, chance);
}

function logChanceFind(
  writer: DemoWriter,
  ground: DemoGround,
  random: SeededRandom,
  outing: Outing,
  arm: number,
  at: number,
): void {
  const dialHz = random.pick([5_955, 6_155, 7_310, 9_505, 9_775, 11_905, 13_715]) * 1000;
  writer.add(outing.person, 'reception', at, {
    ...emptyReception(outing, ground, arm, at),
    outcome: 'heard',
    basis: 'chance',
    identity: 'unknown',
    tuning: { dialHz, mode: 'AM' },
    sinpo: demoSinpo(random, 0.5, DEMO_PLACES[outing.site]!, false),
    remarks: random.pick([
      'Dance music, no announcement.',
      'Talk, two voices.',
      'Choir, fading deeply.',
      null,
    ]),
  });
}

type Blank = Omit<Reception, 'deleted' | 'importId' | 'outcome' | 'basis' | 'tuning'>;

function emptyReception(outing: Outing, ground: DemoGround, arm: number, at: number): Blank {
  return {
    outingId: outing.outingId,
    siteId: ground.siteIds[outing.site]!,
    setupId: outing.setupIds[arm]!,
    targetId: null,
    targetHz: null,
    eventId: null,
    swap: null,
    roundNo: null,
    identity: 'sure',
    nilReason: null,
    deviceAt: at - outing.person.clockOffsetMs,
    durationS: null,
    bandwidthHz: null,
    attenuationDb: null,
    sinpo: null,
    rst: null,
    meter: null,
    noiseMeter: null,
    carried: null,
    programme: null,
    remarks: null,
    stationName: null,
    heardBy: null,
  };
}
