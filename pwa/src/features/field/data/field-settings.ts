import type { SetupConfirmation } from '@harkmoor/sync-model/records/setup-question';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readSetting, type OpenLog } from '../../../store/open-log';
import type { UndoableAct } from './last-act';

/** What this phone alone remembers of an outing; nothing of it is sent. */
export const FIELD_SETTING = {
  lastOutingId: (clubId: string) => `field.last-outing.${clubId}`,
  outdatedChecks: (clubId: string) => `field.outdated-checks.${clubId}`,
  outing: (outingId: string) => `field.outing.${outingId}`,
} as const;

export type OutingMemory = {
  /** The round that was begun by hand: one without an entry yet is known nowhere else. */
  roundNo: number;
  setup: SetupConfirmation | null;
  act: UndoableAct | null;
  /** The cautions were read and put away for this outing. */
  cautionsRead: boolean;
};

const EMPTY: OutingMemory = { roundNo: 1, setup: null, act: null, cautionsRead: false };

export async function readOutingMemory(log: OpenLog, outingId: string): Promise<OutingMemory> {
  const stored = await readSetting<Partial<OutingMemory>>(log.database, FIELD_SETTING.outing(outingId));
  return { ...EMPTY, ...stored };
}

/** Changes part of the memory in one transaction, so that two quick taps never lose one another's part. */
export async function changeOutingMemory(
  log: OpenLog,
  outingId: string,
  change: Partial<OutingMemory>,
): Promise<void> {
  const { database } = log;
  await database.transaction('rw', database.settings, async () => {
    const memory = await readOutingMemory(log, outingId);
    await database.settings.put({ name: FIELD_SETTING.outing(outingId), value: { ...memory, ...change } });
  });
}

export function useOutingMemory(outingId: string): OutingMemory | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readOutingMemory(log, outingId), [log, outingId]);
}
