import type { Change, SyncAnswer, SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { CHANGES_PER_ROUND_MAX } from '@harkmoor/sync-model/protocol/limits';
import { PROTOCOL_VERSION } from '@harkmoor/sync-model/protocol/version';
import { sendingOrder } from '@harkmoor/sync-model/records/record-types';
import type { DemoHome } from './demo-accounts.js';
import type { DemoChange } from './demo-writer.js';
import { DEMO_PEOPLE } from './demo-people.js';

type Answer = (accountId: string, request: SyncRequest) => Promise<SyncAnswer>;

/**
 * Sends the demo as its people's phones would: through the sync round itself, founders' gear and lists before what
 * refers to them. Repeating it changes nothing.
 */
export async function pushDemo(
  answer: Answer,
  changes: readonly DemoChange[],
  homes: ReadonlyMap<string, DemoHome>,
  nowMs: number,
): Promise<void> {
  for (const isGround of [true, false]) {
    for (const { key, deviceId } of DEMO_PEOPLE) {
      const home = homes.get(key)!;
      for (const log of ['my-log', 'club'] as const) {
        const own = changes.filter(
          (row) => row.person === key && row.log === log && isOfGround(row.change) === isGround,
        );
        const clubId = log === 'club' ? home.clubId : home.myLogId;
        await pushAll(
          answer,
          home.accountId,
          { clubId, deviceId, nowMs },
          own.map((row) => row.change),
        );
      }
    }
  }
}

/** What others' records refer to: all of it goes before anybody's outings. */
function isOfGround({ type }: Change): boolean {
  return sendingOrder(type) < sendingOrder('outing');
}

type Place = { clubId: string; deviceId: string; nowMs: number };

async function pushAll(
  answer: Answer,
  accountId: string,
  place: Place,
  changes: readonly Change[],
): Promise<void> {
  const ordered = [...changes].sort((a, b) => sendingOrder(a.type) - sendingOrder(b.type));
  for (let from = 0; from < ordered.length; from += CHANGES_PER_ROUND_MAX) {
    const batch = ordered.slice(from, from + CHANGES_PER_ROUND_MAX);
    const told = await answer(accountId, {
      protocol: PROTOCOL_VERSION,
      deviceId: place.deviceId,
      sentAt: place.nowMs,
      clubs: [{ clubId: place.clubId, historyId: null, cursor: Number.MAX_SAFE_INTEGER, changes: batch }],
    });
    const results = told.clubs.find((club) => club.clubId === place.clubId)?.results ?? [];
    const failed = results.find((result) => result.status !== 'applied');
    if (told.code || failed || results.length !== batch.length) {
      throw new Error(`the demo was not taken: ${told.code ?? JSON.stringify(failed)}`);
    }
  }
}
