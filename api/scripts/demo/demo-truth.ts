import { sunAltitudeDeg } from '@harkmoor/sync-model/radio/sun/sun';
import { DEMO_ANTENNAS, type DemoAntenna } from './demo-gear.js';
import { DEMO_SILENCE, DEMO_TARGETS, type DemoTarget } from './demo-targets.js';

/** The middle of the invented coast: the truth moves with the sun here, the same for every site. */
const REFERENCE = { latDeg: 56.2, lonDeg: 8.25 };
/** Degrees of sun altitude over which a band opens or closes. */
const TURN_WIDTH_DEG = 7;

export const DEMO_MONTHS = ['2026-08', '2026-09', '2026-10', '2026-11'] as const;

/**
 * The hidden chance (0…1) that a try hears the target, by UTC hour and calendar month, with an antenna: bands
 * turn with the sun's altitude at mid-hour on the 15th. Zero while the silent station is silent.
 */
export function trueHeardProbability(target: DemoTarget, antenna: DemoAntenna, trueAt: number): number {
  if (target.name === DEMO_SILENCE.targetName && trueAt >= DEMO_SILENCE.from && trueAt < DEMO_SILENCE.to)
    return 0;
  const date = new Date(trueAt);
  const midHour = Date.UTC(date.getUTCFullYear(), date.getUTCMonth(), 15, date.getUTCHours(), 30);
  return logistic(targetLogit(target, midHour) + antennaLogit(antenna, target.frequencyHz));
}

function targetLogit(target: DemoTarget, atMs: number): number {
  const altitude = referenceAltitudeDeg(atMs);
  const dayShare = logistic(altitude / (TURN_WIDTH_DEG / 2));
  const openShare = target.heardBy === 'night' ? 1 - dayShare : dayShare;
  return target.worstLogit + (target.bestLogit - target.worstLogit) * openShare;
}

const altitudes = new Map<number, number>();

/** Four months have 96 such hours, asked for thousands of times. */
function referenceAltitudeDeg(atMs: number): number {
  let altitude = altitudes.get(atMs);
  if (altitude === undefined) {
    altitude = sunAltitudeDeg(REFERENCE, atMs);
    altitudes.set(atMs, altitude);
  }
  return altitude;
}

function antennaLogit(antenna: DemoAntenna, frequencyHz: number): number {
  const { clearer } = antenna;
  const isClearer = clearer && frequencyHz >= clearer.lowHz && frequencyHz <= clearer.highHz;
  return antenna.shiftLogit + (isClearer ? clearer.shiftLogit : 0);
}

function logistic(x: number): number {
  return 1 / (1 + Math.exp(-x));
}

/** All that the demo hides, for `demo-truth.json`: a table, and the facts that the product should find. */
export function demoTruth() {
  const cells = DEMO_TARGETS.flatMap((target) =>
    DEMO_ANTENNAS.flatMap((antenna) =>
      DEMO_MONTHS.map((month) => ({
        target: target.name,
        frequencyHz: target.frequencyHz,
        antenna: antenna.name,
        month,
        heardByHourUtc: Array.from({ length: 24 }, (_, hour) =>
          round(trueHeardProbability(target, antenna, Date.parse(`${month}-25T${pad(hour)}:30:00Z`))),
        ),
      })),
    ),
  );
  return {
    silentStation: DEMO_SILENCE,
    clearerAntenna: { antenna: 'Frame loop', band: '49 m' },
    louderOnlyAntenna: { antenna: 'Active rod', louderDb: 14 },
    wrongClock: { person: 'Birger Tangholm', offsetMs: 400_000 },
    sloppyPerson: 'Knud Ravnsgård',
    cells,
  };
}

const round = (p: number) => Math.round(p * 10_000) / 10_000;
const pad = (hour: number) => String(hour).padStart(2, '0');
