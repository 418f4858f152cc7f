import type { Observation } from './observations.js';
import { wilsonInterval, type Interval } from './wilson.js';

/** Fewer observations or dates than these are thin evidence and look thin. */
export const THIN_N = 5;
export const THIN_DATES = 3;
export const BAND_CHANNELS_MIN = 3;
export const BAND_CHANNEL_N_MIN = 5;

export type HeardRate = {
  /** Observations. */
  readonly n: number;
  readonly heard: number;
  /** Distinct UTC dates. */
  readonly dates: number;
  /** Distinct UTC hours of day with an observation. */
  readonly hours: number;
  readonly isThin: boolean;
} & (
  | { /** 0..1 */ readonly rate: number; /** 95 % */ readonly interval: Interval; readonly reason: null }
  | { readonly rate: null; readonly interval: null; readonly reason: 'nothing-tried' | 'too-few-channels' }
);

/** Said where there is no rate. */
export const NO_RATE_WORDS = {
  'nothing-tried': 'Nothing was tried here.',
  'too-few-channels': 'A band has a rate when at least 3 of its channels have 5 observations each.',
} as const;

type Counted = Pick<Observation, 'heard' | 'hourUtc' | 'dayNumber'>;

/**
 * The heard rate of observations of one channel or one target. Within one UTC hour: heard / n with its Wilson
 * interval. Over several: the mean of the hours' rates, so that an hour tried often does not drown the others,
 * with the number of dates for n, because the hours of one evening are no independent trials. Pass one stream
 * of `Observations` only; for a band take `bandRate`.
 */
export function heardRate(observations: readonly Counted[]): HeardRate {
  const nByHour = new Array<number>(24).fill(0);
  const heardByHour = new Array<number>(24).fill(0);
  const dates = new Set<number>();
  let heard = 0;
  for (const observation of observations) {
    dates.add(observation.dayNumber);
    nByHour[observation.hourUtc]!++;
    if (observation.heard) {
      heard++;
      heardByHour[observation.hourUtc]!++;
    }
  }
  return rateOf({ n: observations.length, heard, dates: dates.size, nByHour, heardByHour });
}

type Tally = {
  n: number;
  heard: number;
  dates: number;
  nByHour: readonly number[];
  heardByHour: readonly number[];
};

function rateOf({ n, heard, dates, nByHour, heardByHour }: Tally): HeardRate {
  let hours = 0;
  let sum = 0;
  for (let hour = 0; hour < 24; hour++) {
    if (nByHour[hour] === 0) continue;
    hours++;
    sum += heardByHour[hour]! / nByHour[hour]!;
  }
  const counted = { n, heard, dates, hours, isThin: isThin(n, dates) };
  if (hours === 0) return { ...counted, rate: null, interval: null, reason: 'nothing-tried' };
  const rate = sum / hours;
  const weight = hours > 1 ? dates : n;
  return { ...counted, rate, interval: wilsonInterval(rate * weight, weight), reason: null };
}

export function isThin(n: number, dates: number): boolean {
  return n < THIN_N || dates < THIN_DATES;
}

export type BandRate = HeardRate & {
  /** Channels with at least 5 observations: the rate is their mean. */
  readonly channels: number;
  /** Channels with fewer: counted in n, heard and dates, not in the rate. */
  readonly channelsLeftOut: number;
};

/**
 * The rate of a band: the mean of its channels' rates, from at least 3 channels of at least 5 observations; else
 * none, and why. Its interval is Wilson's with the dates of those channels for n, as over several hours. A band
 * that is logged as a whole (amateur) is its own channel: take `heardRate` for it.
 */
export function bandRate(observations: readonly (Counted & Pick<Observation, 'channelKey'>)[]): BandRate {
  const byChannel = new Map<string, Counted[]>();
  for (const observation of observations) {
    const channel = byChannel.get(observation.channelKey);
    if (channel) channel.push(observation);
    else byChannel.set(observation.channelKey, [observation]);
  }
  const enough = [...byChannel.entries()]
    .filter(([, channel]) => channel.length >= BAND_CHANNEL_N_MIN)
    // A fixed order, so that the sum of fractions does not hang on the order of the input.
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([, channel]) => channel);
  const { n, heard, dates, hours, isThin } = heardRate(observations);
  const channels = { channels: enough.length, channelsLeftOut: byChannel.size - enough.length };
  const counted = { n, heard, dates, hours, isThin, ...channels };
  if (enough.length < BAND_CHANNELS_MIN) {
    const reason = n === 0 ? 'nothing-tried' : 'too-few-channels';
    return { ...counted, rate: null, interval: null, reason };
  }
  const rate = enough.reduce((sum, channel) => sum + heardRate(channel).rate!, 0) / enough.length;
  const weight = new Set(enough.flat().map(({ dayNumber }) => dayNumber)).size;
  return { ...counted, rate, interval: wilsonInterval(rate * weight, weight), reason: null };
}
