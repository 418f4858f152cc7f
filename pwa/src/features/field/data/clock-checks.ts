import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { ClockCheck } from '@harkmoor/sync-model/records/clock-check';
import type { TimeCheck } from '@harkmoor/sync-model/evidence/corrected-time';
import { CHECK_REACH_MS } from '@harkmoor/sync-model/evidence/corrected-time';
import { Dexie } from 'dexie';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readSetting, type OpenLog } from '../../../store/open-log';
import { FIELD_SETTING } from './field-settings';

/** UUIDv7 of an instant with all later bits zero: the lower end of a range of ids. */
function firstIdAt(ms: number): string {
  const hex = Math.max(0, ms).toString(16).padStart(12, '0');
  return `${hex.slice(0, 8)}-${hex.slice(8)}-0`;
}

/**
 * The checks that this device made lately; older ones say nothing about now, but for "older than 12 h". None from
 * before a jump of the clock: one that was put back shows some minutes twice, and neither the times nor the stamps of
 * the records tell the two runs apart.
 */
export async function readOwnChecks(log: OpenLog, nowMs: number): Promise<TimeCheck[]> {
  const outdated = await readSetting<string[]>(log.database, FIELD_SETTING.outdatedChecks(log.clubId));
  const checks = await recentChecks(log, nowMs);
  return checks.filter(({ id }) => !outdated?.includes(id)).map(({ fields }) => fields);
}

/** The clock has jumped: what was checked until now says nothing about it any more. */
export async function outdateChecks(log: OpenLog, nowMs: number): Promise<void> {
  const ids = (await recentChecks(log, nowMs)).map(({ id }) => id);
  await log.database.settings.put({ name: FIELD_SETTING.outdatedChecks(log.clubId), value: ids });
}

async function recentChecks(log: OpenLog, nowMs: number): Promise<StoredRecord<'clock-check'>[]> {
  const checks = await log.database
    .recordTable('clock-check')
    .where('[clubId+id]')
    .between([log.clubId, firstIdAt(nowMs - 20 * CHECK_REACH_MS)], [log.clubId, Dexie.maxKey])
    .toArray();
  return checks.filter(({ fields }) => fields.deviceId === log.deviceId && !fields.deleted);
}

export function useOwnChecks(): TimeCheck[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readOwnChecks(log, Date.now()), [log]);
}

export async function saveClockCheck(
  log: OpenLog,
  check: Pick<ClockCheck, 'deviceAt' | 'offsetMs' | 'uncertaintyMs' | 'method' | 'pathKm'>,
): Promise<void> {
  await log.writer.create('clock-check', {
    deleted: false,
    importId: null,
    deviceId: log.deviceId,
    ...check,
  });
}
