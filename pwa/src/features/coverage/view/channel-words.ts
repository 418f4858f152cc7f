import { channelOfKey, formatChannel } from '@harkmoor/sync-model/radio/bands/channel';

/** "6 070 kHz" or "40 m amateur" for a channel's key; the key itself where it is none. */
export function channelWords(key: string): string {
  const channel = channelOfKey(key);
  return channel ? formatChannel(channel) : key;
}
