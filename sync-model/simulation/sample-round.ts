import type { Change, SyncAnswer, SyncClubAnswer, SyncRequest } from '../src/protocol/messages.js';
import { formatStamp, type Stamp } from '../src/stamp/stamp.js';
import type { HubClubState } from './memory-hub.js';
import { ANNA, CLUB, idOf } from './people.js';
import type { QuietWorld } from './quiet-world.js';
import { SAMPLES } from './sample-fields.js';

export const SITE = idOf(1);
export const RECEIVER = idOf(2);
export const ANTENNA = idOf(3);
export const SETUP = idOf(4);
export const RECEPTION = idOf(5);
export const NOW_MS = Date.UTC(2026, 5, 1);

/** A stamp so many seconds after the server's time. */
export function at(second: number, deviceId = 'phonea01'): Stamp {
  return formatStamp({ wallMs: NOW_MS + second * 1000, counter: 0, deviceId });
}

export function whole(type: Change['type'], id: string, fields: object, stamp = at(0)): Change {
  return { type, id, at: stamp, fields: { ...fields } };
}

export function edit(type: Change['type'], id: string, fields: object, stamp: Stamp, base = at(0)): Change {
  const bases = Object.keys(fields).map((field) => [field, base] as const);
  return { type, id, at: stamp, fields: { ...fields }, base: Object.fromEntries(bases) };
}

export const site = () => whole('site', SITE, SAMPLES.site('Ravnklit'));
export const gear = () => [
  whole('receiver', RECEIVER, SAMPLES.receiver('bag receiver')),
  whole('antenna', ANTENNA, SAMPLES.antenna('long wire')),
  whole('setup', SETUP, SAMPLES.setup(RECEIVER, ANTENNA)),
];
export const reception = () => whole('reception', RECEPTION, SAMPLES.reception(SITE, SETUP));

export function request(changes: Change[], { clubId = CLUB, cursor = 0 } = {}): SyncRequest {
  const clubs = [{ clubId, historyId: null, cursor, changes }];
  return { protocol: 1, deviceId: 'phonea01', sentAt: NOW_MS, clubs };
}

export async function push(
  world: QuietWorld,
  changes: Change[],
  accountId = ANNA,
  cursor = 0,
): Promise<SyncClubAnswer> {
  return clubOf(await world.ask(accountId, request(changes, { cursor })));
}

export function clubOf(answer: SyncAnswer, clubId = CLUB): SyncClubAnswer {
  const club = answer.clubs.find((one) => one.clubId === clubId);
  if (!club) throw new Error('the answer has no such club');
  return club;
}

/** All that the hub holds, as text. */
export function everything({ hub }: QuietWorld): string {
  return JSON.stringify([...hub.clubs.values()].map((club) => [...club.records, ...club.history, club.seq]));
}

export function hubClub({ hub }: QuietWorld): HubClubState {
  return hub.clubs.get(CLUB)!;
}

export function hubRecord(world: QuietWorld, type: string, id: string) {
  return hubClub(world).records.get(`${type}/${id}`);
}
