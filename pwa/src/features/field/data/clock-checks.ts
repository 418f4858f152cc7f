import type { ClockCheck } from '@harkmoor/sync-model/records/clock-check';
import type { StampedCheck } from '@harkmoor/sync-model/evidence/clock-trust';
import { CHECK_REACH_MS } from '@harkmoor/sync-model/evidence/corrected-time';
import { Dexie } from 'dexie';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import type { OpenLog } from '../../../store/open-log';

/** UUIDv7 of an instant with all later bits zero: the lower end of a range of ids. */
function firstIdAt(ms: number): string {
  const hex = Math.max(0, ms).toString(16).padStart(12, '0');
  return `${hex.slice(0, 8)}-${hex.slice(8)}-0`;
}

/** The checks that this device made lately; older ones say nothing about now, but for "older than 12 h". */
export async function readOwnChecks(log: OpenLog, nowMs: number): Promise<StampedCheck[]> {
  const checks = await log.database
    .recordTable('clock-check')
    .where('[clubId+id]')
    .between([log.clubId, firstIdAt(nowMs - 20 * CHECK_REACH_MS)], [log.clubId, Dexie.maxKey])
    .toArray();
  return checks
    .map((record) => ({ ...record.fields, stamp: record.at }))
    .filter((check) => check.deviceId === log.deviceId && !check.deleted);
}

export function useOwnChecks(): StampedCheck[] | undefined {
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
