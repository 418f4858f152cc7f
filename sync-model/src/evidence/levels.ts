import type { Receiver } from '../records/receiver.js';
import { medianRanks } from './median-interval.js';
import type { Observation } from './observations.js';

export type Level =
  | { readonly kind: 'level'; readonly medianDbm: number }
  /** More than half of the tries were nil: the level lies below the lowest that was read, or is unknown. */
  | { readonly kind: 'below-floor'; readonly floorDbm: number | null };

export type LevelGroup = {
  /** The receiver; null where calibrated ones are pooled. */
  readonly receiverId: string | null;
  readonly isCalibrated: boolean;
  /** Tries behind the figure: nils and heard with a reading. */
  readonly n: number;
  readonly nils: number;
  readonly read: number;
  /** Heard without a reading: only their number counts, in the share of nils. */
  readonly unread: number;
  readonly level: Level;
  /** 95 %; `lowDbm` null: below the floor; the whole null under six tries or where readings are missing. */
  readonly interval: { readonly lowDbm: number | null; readonly highDbm: number | null } | null;
};

type Levelled = Pick<Observation, 'heard' | 'levelDbm' | 'receiverId'>;

/**
 * The typical level: median over all tries, with nils as "below" whatever was read; never a mean of the heard.
 * Receivers with calibrated meters are pooled, every other one stands alone; one that was never read though it mostly
 * heard is left out. Where some heard entries have no reading, the read ones stand for them, so that a meter seldom read does
 * not make a strong signal look like a nil.
 */
export function levels(
  observations: readonly Levelled[],
  receivers: ReadonlyMap<string, Pick<Receiver, 'meterScale'>>,
): LevelGroup[] {
  const groups = new Map<string | null, Levelled[]>();
  for (const observation of observations) {
    const { receiverId } = observation;
    const scale = receiverId === null ? undefined : receivers.get(receiverId)?.meterScale;
    if (!scale || scale.kind === 'none') continue;
    const key = scale.calibrated ? null : receiverId;
    const group = groups.get(key);
    if (group) group.push(observation);
    else groups.set(key, [observation]);
  }
  return [...groups.entries()]
    .sort(([a], [b]) => (a === null ? -1 : b === null ? 1 : a < b ? -1 : 1))
    .filter(([, group]) => hasLevel(group))
    .map(([receiverId, group]) => levelOf(receiverId, group));
}

function hasLevel(group: readonly Levelled[]): boolean {
  const heard = group.filter((one) => one.heard);
  return heard.some((one) => one.levelDbm !== null) || 2 * heard.length < group.length;
}

function levelOf(receiverId: string | null, group: readonly Levelled[]): LevelGroup {
  const readings = group
    .flatMap(({ heard, levelDbm }) => (heard && levelDbm !== null ? [levelDbm] : []))
    .sort((a, b) => a - b);
  const heard = group.filter((one) => one.heard).length;
  const nils = group.length - heard;
  const read = readings.length;
  return {
    receiverId,
    isCalibrated: receiverId === null,
    n: nils + read,
    nils,
    read,
    unread: heard - read,
    level: medianLevel(readings, nils, heard),
    interval: heard === read ? intervalOf(readings, nils) : null,
  };
}

function medianLevel(readings: readonly number[], nils: number, heard: number): Level {
  if (nils > heard) return { kind: 'below-floor', floorDbm: readings[0] ?? null };
  const read = readings.length;
  // Each reading stands for heard / read tries. The middle try is this far up among the readings.
  const middle = ((heard - nils) * read) / (2 * heard);
  if (!Number.isInteger(middle)) return { kind: 'level', medianDbm: readings[Math.floor(middle)]! };
  // Half nil exactly: of the two in the middle one is only known to be below, so the other is told.
  if (middle === 0) return { kind: 'level', medianDbm: readings[0]! };
  return { kind: 'level', medianDbm: (readings[middle - 1]! + readings[middle]!) / 2 };
}

function intervalOf(readings: readonly number[], nils: number): LevelGroup['interval'] {
  const ranks = medianRanks(nils + readings.length);
  if (!ranks) return null;
  return {
    lowDbm: readings[ranks.low - 1 - nils] ?? null,
    highDbm: readings[ranks.high - 1 - nils] ?? null,
  };
}
