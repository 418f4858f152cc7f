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

/** One outing as the generator knows it; instants are true ones. */
export type Outing = {
  person: DemoPerson;
  site: number;
  outingId: string;
  setupIds: string[];
  startedAt: number;
  endedAt: number;
};

type Entry = { target: number; arm: number; roundNo: number; at: number };

/** One row of a round: heard or nil by the hidden chance; off the air it is passed over, but for the sloppy. */
export function logTarget(
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

/** A signal that was simply met: it gives scores, never rates. */
export function logChanceFind(
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
