import type { SyncAnswer } from '../src/protocol/messages.js';
import { stampOf } from '../src/merge/record-state.js';
import { SERVER_DEVICE_ID } from '../src/stamp/stamp.js';
import type { DiskState } from './disk.js';
import type { Fate } from './network.js';
import type { HubClubState } from './memory-hub.js';

/** States that a run must reach sometimes: without them, "nothing was found" would mean little. */
export const RARE_STATES = [
  'a write waited for another',
  'crash in a round',
  'crash in an act',
  'hub crashed',
  'late request',
  'left a club',
  'page was cut',
  'code: clock-ahead',
  'result: applied',
  'result: held',
  'result: refused',
  'network: answer-lost',
  'network: answer-cut',
  'network: portal',
  'network: twice',
  'network: late',
  'network: unauthorized',
  'network: throttled',
  'network: server-error',
  'value lost on a phone',
  'lost value reached the hub',
  'restamped',
  'stays above a later server value',
  'edited while it was sent',
  'offset learned',
  'offset forgotten',
  'clash in the feed',
  'clash on a phone',
  'deleted and edited',
  'retired in place of deletion',
  'restored',
  'held record let go',
] as const;

export type RareState =
  (typeof RARE_STATES)[number] | `network: ${Fate}` | `code: ${string}` | `result: ${string}`;

export function noteRareSave(reached: Set<RareState>, before: HubClubState, after: HubClubState): void {
  for (const row of after.history.slice(before.history.length)) {
    if (row.seq !== null) reached.add('clash in the feed');
    if (row.seq !== null && row.replaced.stamp < row.kept.stamp) reached.add('lost value reached the hub');
    if (row.field === 'deleted' && row.kept.stamp.endsWith(SERVER_DEVICE_ID)) {
      reached.add('retired in place of deletion');
    }
    if (row.field === 'deleted' && row.replaced.value === true) reached.add('restored');
  }
  for (const [key, record] of after.records) {
    const old = before.records.get(key);
    if (old && old !== record && record.fields.deleted === true && old.fields.deleted === true) {
      reached.add('deleted and edited');
    }
  }
}

export function noteRareCommit(reached: Set<RareState>, before: DiskState, after: DiskState): void {
  const [offset, told] = [before, after].map(
    ({ settings }) => (settings.get('clockOffsetMs') as number) ?? 0,
  );
  if (offset !== told) reached.add(told === 0 ? 'offset forgotten' : 'offset learned');
  for (const [key, record] of after.records) {
    const old = before.records.get(key);
    if (old === record) continue;
    if (record.type === 'history') reached.add('clash on a phone');
    if (!old?.debt) continue;
    if (old.debt.status === 'held' && record.debt?.status !== 'held') reached.add('held record let go');
    if ((record.debt?.lost?.length ?? 0) > (old.debt.lost?.length ?? 0)) reached.add('value lost on a phone');
    for (const [field, owed] of Object.entries(record.debt?.fields ?? {})) {
      if (owed.over && !old.debt.fields[field]?.over) reached.add('stays above a later server value');
      if (owed.base !== null && owed.base !== old.debt.fields[field]?.base)
        reached.add('edited while it was sent');
      if (stampOf(record, field) < stampOf(old, field)) reached.add('restamped');
    }
  }
}

export function noteRareAnswer(reached: Set<RareState>, answer: SyncAnswer): void {
  if (answer.code) reached.add(`code: ${answer.code}`);
  for (const club of answer.clubs) {
    if (club.more && club.records.length > 0) reached.add('page was cut');
    for (const result of club.results) reached.add(`result: ${result.status}`);
  }
}
