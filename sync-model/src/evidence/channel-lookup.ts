import { bandAt, bandLabel } from '../radio/bands/bands.js';
import { channelKey, channelOf } from '../radio/bands/channel.js';
import type { ItuRegion } from '../radio/bands/region.js';

export type PlacedChannel = {
  readonly channelKey: string;
  /** "49 m broadcast"; null outside every band of the region. */
  readonly bandKey: string | null;
  /** The channel is the whole band, as in amateur bands. */
  readonly isWholeBand: boolean;
  /** The channel's frequency, or the one met where the channel is a band; Hz. */
  readonly frequencyHz: number;
};

export type ChannelLookup = (dialHz: number, targetHz: number | null) => PlacedChannel;

/** Channel and band of a reception, each frequency worked out once: a club listens to the same few over and over. */
export function channelLookup(region: ItuRegion): ChannelLookup {
  const byTarget = new Map<number, PlacedChannel>();
  const byDial = new Map<number, PlacedChannel>();
  return (dialHz, targetHz) => {
    const known = targetHz === null ? byDial : byTarget;
    const frequencyHz = targetHz ?? dialHz;
    let placed = known.get(frequencyHz);
    if (placed === undefined) known.set(frequencyHz, (placed = placeOf(dialHz, targetHz, region)));
    return placed;
  };
}

function placeOf(dialHz: number, targetHz: number | null, region: ItuRegion): PlacedChannel {
  const channel = channelOf({ dialHz, targetHz, region });
  const frequencyHz = channel.kind === 'channel' ? channel.hz : dialHz;
  const band = bandAt(frequencyHz, region);
  return {
    channelKey: channelKey(channel),
    bandKey: band && bandLabel(band),
    isWholeBand: channel.kind === 'band',
    frequencyHz,
  };
}
