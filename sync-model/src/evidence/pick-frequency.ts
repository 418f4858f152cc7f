import { heardRate, type HeardRate } from './heard-rate.js';
import type { Observation } from './observations.js';
import { wilsonInterval } from './wilson.js';

export type FrequencyChoice = {
  readonly channelKey: string;
  /** The rate over the hours needed: column *heard*, tries on dates. */
  readonly heard: HeardRate;
  /** Mean over the hours needed of the lower 95 % bound, 0 where nothing was tried: column *at least*; 0..1. */
  readonly atLeast: number;
  /** The tried hour with the lowest lower bound, the earliest asked for of several. */
  readonly weakestHour: { readonly hourUtc: number; readonly atLeast: number };
  /** Hours needed in which nothing was tried, in the order asked for. */
  readonly emptyHoursUtc: readonly number[];
};

/**
 * Ranks channels for the hours needed: by the mean of what each hour has shown at the least. An hour without a
 * try counts as never heard, so a frequency cannot win by not having been tested. `observations` are those of
 * channels, at one site or square; hours and their order are the asker's, repeated ones count once. Channels
 * without a try in any of the hours are left out; equal ones stand by the sample, then by key.
 */
export function pickFrequency(
  observations: readonly Observation[],
  hoursNeeded: readonly number[],
): FrequencyChoice[] {
  const hours = [...new Set(hoursNeeded)];
  const byChannel = new Map<string, Observation[]>();
  for (const observation of observations) {
    if (!hours.includes(observation.hourUtc)) continue;
    const channel = byChannel.get(observation.channelKey);
    if (channel) channel.push(observation);
    else byChannel.set(observation.channelKey, [observation]);
  }
  return [...byChannel.entries()].map(([key, channel]) => choiceOf(key, channel, hours)).sort(bestFirst);
}

function choiceOf(
  channelKey: string,
  channel: readonly Observation[],
  hours: readonly number[],
): FrequencyChoice {
  const emptyHoursUtc: number[] = [];
  const tried: { hourUtc: number; atLeast: number }[] = [];
  for (const hourUtc of hours) {
    const inHour = channel.filter((observation) => observation.hourUtc === hourUtc);
    const heard = inHour.filter((observation) => observation.heard).length;
    if (inHour.length === 0) emptyHoursUtc.push(hourUtc);
    else tried.push({ hourUtc, atLeast: wilsonInterval(heard, inHour.length).low });
  }
  return {
    channelKey,
    heard: heardRate(channel),
    atLeast: tried.reduce((sum, { atLeast }) => sum + atLeast, 0) / hours.length,
    weakestHour: tried.reduce((weakest, hour) => (hour.atLeast < weakest.atLeast ? hour : weakest)),
    emptyHoursUtc,
  };
}

function bestFirst(a: FrequencyChoice, b: FrequencyChoice): number {
  return b.atLeast - a.atLeast || b.heard.n - a.heard.n || (a.channelKey < b.channelKey ? -1 : 1);
}
