import type { Outing } from '@harkmoor/sync-model/records/outing';
import { setupMend } from '@harkmoor/sync-model/records/batch-mend';
import {
  outingFromStart,
  SETUPS_PER_OUTING_MAX,
  type OutingStart,
} from '@harkmoor/sync-model/records/outing-from-start';
import type { WriteStep } from '../../../store/log-writer';
import type { OpenLog } from '../../../store/open-log';
import { outdateChecks } from './clock-checks';
import { changeOutingMemory, FIELD_SETTING } from './field-settings';
import { readEntries } from './outing-entries';
import { readOwnOutings, type StoredOuting } from './running-outing';

/** Starts an outing now and ends the one that still ran, both or neither. `before` are records that it needs. */
export async function startOuting(
  log: OpenLog,
  start: OutingStart,
  nowMs: number,
  before: readonly WriteStep[] = [],
): Promise<string> {
  const id = log.writer.newId();
  const { running } = await readOwnOutings(log, nowMs);
  const steps: WriteStep[] = [...before];
  if (running) {
    const ended = { at: Math.max(running.fields.startedAt, nowMs), by: 'next' } as const;
    steps.push({ kind: 'edit', type: 'outing', id: running.id, patch: { ended } });
  }
  steps.push({ kind: 'create', type: 'outing', id, fields: outingFromStart(start, nowMs) });
  await log.writer.apply(steps);
  await log.database.settings.put({ name: FIELD_SETTING.lastOutingId(log.clubId), value: id });
  const setup = { setupId: start.currentSetupId, atMs: nowMs, roundNo: 1 };
  await changeOutingMemory(log, id, { setup });
  return id;
}

export async function endOuting(
  log: OpenLog,
  outing: StoredOuting,
  atMs: number,
  by: NonNullable<Outing['ended']>['by'],
): Promise<void> {
  const at = Math.max(outing.fields.startedAt, atMs);
  await log.writer.edit('outing', outing.id, { ended: { at, by } });
}

/** Entries from now on carry this setup; earlier ones keep theirs. A setup not taken along yet joins the outing. */
export async function switchSetup(
  log: OpenLog,
  outing: StoredOuting,
  setupId: string,
  now: { atMs: number; roundNo: number },
): Promise<void> {
  const { setupIds } = outing.fields;
  const isNew = !setupIds.includes(setupId);
  if (isNew && setupIds.length >= SETUPS_PER_OUTING_MAX) {
    throw new Error('an outing holds at most six setups');
  }
  await log.writer.edit('outing', outing.id, {
    currentSetupId: setupId,
    ...(isNew ? { setupIds: [...setupIds, setupId] } : {}),
  });
  await confirmSetup(log, outing.id, setupId, now);
}

/** "Still long wire?" – yes. */
export async function confirmSetup(
  log: OpenLog,
  outingId: string,
  setupId: string,
  now: { atMs: number; roundNo: number },
): Promise<void> {
  await changeOutingMemory(log, outingId, { setup: { setupId, ...now } });
}

/** Mends the setup of all entries since an instant at once, and returns how many; one *Undo* takes all back. */
export async function mendSetup(
  log: OpenLog,
  outing: StoredOuting,
  mended: { sinceMs: number; setupId: string; nowMs: number },
): Promise<number> {
  const mend = setupMend(await readEntries(log, outing.id), mended.sinceMs, mended.setupId);
  const steps = mend.replaced.map(({ id }): WriteStep => ({
    kind: 'edit',
    type: 'reception',
    id,
    patch: { setupId: mended.setupId },
  }));
  if (steps.length === 0) return 0;
  await log.writer.apply(steps);
  await changeOutingMemory(log, outing.id, { act: { kind: 'mended', mend, atMs: mended.nowMs } });
  return steps.length;
}

/** A jump of the device clock that was seen while the outing ran. */
export async function noteClockStep(
  log: OpenLog,
  outing: StoredOuting,
  step: { at: number; stepMs: number },
): Promise<void> {
  // first: killed between the two, the phone asks for a check too often rather than trust an outdated one
  await outdateChecks(log, step.at);
  const clockSteps = [...outing.fields.clockSteps, step].slice(-200);
  await log.writer.edit('outing', outing.id, { clockSteps });
}

/** Takes another list along from now on; the entries keep their targets. */
export async function changeList(
  log: OpenLog,
  outing: StoredOuting,
  targetListId: string | null,
): Promise<void> {
  await log.writer.edit('outing', outing.id, { targetListId });
}
