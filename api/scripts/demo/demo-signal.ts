import type { MeterReading } from '@harkmoor/sync-model/records/common-fields';
import type { Sinpo } from '@harkmoor/sync-model/records/reception';
import type { DemoAntenna, DemoReceiver } from './demo-gear.js';
import type { DemoPlace } from './demo-places.js';
import type { SeededRandom } from './seeded-random.js';

type Grade = Sinpo['s'];

const NOISE_GRADE: Record<DemoPlace['environment'], number> = {
  city: 2,
  residential: 3,
  rural: 4,
  'quiet-rural': 5,
};
const NOISE_DBM: Record<DemoPlace['environment'], number> = {
  city: -88,
  residential: -95,
  rural: -104,
  'quiet-rural': -112,
};

/** A score that a careful person would give: O is never above the element that limits it. */
export function demoSinpo(
  random: SeededRandom,
  chance: number,
  place: DemoPlace,
  isSloppy: boolean,
): Sinpo | null {
  if (isSloppy && random.unit() < 0.35) return null;
  const margin = Math.log((chance + 0.01) / (1.01 - chance));
  const s = grade(3.1 + margin * 0.5 + random.normal() * 0.6);
  const i = grade(4.2 + random.normal() * 0.7);
  const n = grade(NOISE_GRADE[place.environment] - 0.3 + random.normal() * 0.6);
  const p = grade(3.6 + random.normal() * 0.7);
  const limit = Math.min(s, i, n, p);
  const o = isSloppy
    ? grade(Math.max(s, i, n, p) + (random.unit() < 0.3 ? 1 : 0))
    : grade(limit + (random.unit() < 0.3 ? 1 : 0));
  const orNot = (value: number): Grade => (random.unit() < 0.06 ? 'X' : (value as Grade));
  return { s: orNot(s), i: orNot(i), n: orNot(n), p: orNot(p), o: (isSloppy ? o : Math.min(o, s)) as Grade };
}

/** Signal and the noise beside it as the set shows them; null for a set without a meter or a reading not taken. */
export function demoMeter(
  random: SeededRandom,
  receiver: DemoReceiver,
  antenna: DemoAntenna,
  place: DemoPlace,
  strength: Grade,
): { meter: MeterReading | null; noiseMeter: MeterReading | null } {
  if (!receiver.hasMeter || strength === 'X' || random.unit() < 0.25)
    return { meter: null, noiseMeter: null };
  const noiseDbm = NOISE_DBM[place.environment] + antenna.louderDb + random.normal() * 2;
  const signalDbm = Math.max(noiseDbm + 1, noiseDbm + 5 * strength + random.normal() * 3);
  return { meter: reading(receiver, signalDbm), noiseMeter: reading(receiver, noiseDbm) };
}

function reading(receiver: DemoReceiver, dbm: number): MeterReading {
  const { kind, s9Dbm, dbPerS } = receiver.meterScale;
  if (kind === 'dbm') return { dbm: Math.round(Math.max(-150, Math.min(20, dbm))) };
  if (dbm >= s9Dbm) return { s: 9, overDb: Math.min(80, Math.round((dbm - s9Dbm) / 5) * 5) };
  return { s: Math.max(0, Math.min(9, Math.round(9 + (dbm - s9Dbm) / dbPerS))), overDb: 0 };
}

function grade(value: number): number {
  return Math.max(1, Math.min(5, Math.round(value)));
}
