import { bandAt, type Band } from './bands.js';
import { frequencyText } from './frequency-text.js';
import type { ItuRegion } from './region.js';

/** What receptions are counted under: a frequency in Hz or, among amateurs, who have no channels, the whole band. */
export type Channel = { kind: 'channel'; hz: number } | { kind: 'band'; name: string };

/** Names in metres are custom; 9 kHz plans hold in Regions 1 and 3 (GE75), 10 kHz in Region 2. */
const LONG_AND_MEDIUM_WAVE = ['LW', 'MW'];
const HF_TOP_HZ = 30_000_000;

/**
 * The channel of a reception: the target's frequency as it was at the entry, else the nearest step of the
 * band's raster (LW and MW 9 or 10 kHz by region, HF broadcast 5 kHz, VHF FM 100 kHz, all else 1 kHz), in
 * an amateur band the band. Half way between two steps the upper one.
 */
export function channelOf(reception: {
  dialHz: number;
  targetHz: number | null;
  region: ItuRegion;
}): Channel {
  const { dialHz, targetHz, region } = reception;
  if (targetHz !== null) return { kind: 'channel', hz: targetHz };
  const band = bandAt(dialHz, region);
  if (band?.service === 'amateur') return { kind: 'band', name: band.name };
  const stepHz = rasterHz(band, region);
  return { kind: 'channel', hz: Math.round(dialHz / stepHz) * stepHz };
}

function rasterHz(band: Band | null, region: ItuRegion): number {
  if (band?.service !== 'broadcast') return 1000;
  if (LONG_AND_MEDIUM_WAVE.includes(band.name)) return region === 2 ? 10_000 : 9000;
  return band.lowHz < HF_TOP_HZ ? 5000 : 100_000;
}

/** The channel as a key: equal for equal channels, "6070000" or "40 m". */
export function channelKey(channel: Channel): string {
  return channel.kind === 'channel' ? String(channel.hz) : channel.name;
}

/** The channel of a key that `channelKey` made; undefined for any other text. */
export function channelOfKey(key: string): Channel | undefined {
  if (/^[1-9]\d{0,9}$/.test(key)) return { kind: 'channel', hz: Number(key) };
  return /^[1-9]\d{0,3} m$/.test(key) ? { kind: 'band', name: key } : undefined;
}

/** "6 070 kHz" or "40 m amateur". */
export function formatChannel(channel: Channel): string {
  return channel.kind === 'channel' ? frequencyText(channel.hz) : `${channel.name} amateur`;
}
