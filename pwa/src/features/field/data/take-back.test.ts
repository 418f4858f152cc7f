// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import type { OpenLog } from '../../../store/open-log';
import { saveEdit } from './entry-writer';
import { readOutingMemory } from './field-settings';
import { lastActOf, madeAtMs, undo } from './last-act';
import { readEntries } from './outing-entries';
import { nilIn, outingOnAPhone } from './outing-on-a-phone';
import { mendSetup } from './outing-writer';
import type { StoredOuting } from './running-outing';

let log: OpenLog;
let outing: StoredOuting;

beforeEach(async () => {
  ({ log, outing } = await outingOnAPhone());
});

describe('what can be taken back', () => {
  it('should be the newest entry, then its way out of the bin, and nothing older after that', async () => {
    await nilIn(log, outing);
    const second = await nilIn(log, outing);
    const act = async () =>
      lastActOf(await readEntries(log, outing.id), (await readOutingMemory(log, outing.id)).act);
    const newest = (await act())!;
    expect(newest).toMatchObject({ kind: 'entry', entry: { id: second } });
    await undo(log, outing.id, newest, Date.now());
    const binned = (await act())!;
    expect(binned).toMatchObject({ kind: 'binned', entry: { id: second } });
    await undo(log, outing.id, binned, Date.now());
    expect(await act()).toMatchObject({ kind: 'entry', entry: { id: second, fields: { deleted: false } } });
  });

  it('should be a whole mend at once, but not an entry that was edited since', async () => {
    const ids = [await nilIn(log, outing), await nilIn(log, outing), await nilIn(log, outing)];
    const other = log.writer.newId();
    const changed = await mendSetup(log, outing, {
      sinceMs: 0 + outing.fields.startedAt - 1,
      setupId: other,
      nowMs: Date.now() + 1,
    });
    expect(changed).toBe(3);
    const third = log.writer.newId();
    await log.writer.edit('reception', ids[1]!, { setupId: third });
    const act = lastActOf(await readEntries(log, outing.id), (await readOutingMemory(log, outing.id)).act)!;
    expect(act.kind).toBe('mended');
    await undo(log, outing.id, act, Date.now());
    const setups = (await readEntries(log, outing.id)).map(({ fields }) => fields.setupId);
    expect(setups).toEqual([outing.fields.currentSetupId, third, outing.fields.currentSetupId]);
  });

  it('should be an edit: its values come back, but not over what was changed since', async () => {
    const id = await nilIn(log, outing);
    const act = async () =>
      lastActOf(await readEntries(log, outing.id), (await readOutingMemory(log, outing.id)).act);
    const { fields } = (await readEntries(log, outing.id))[0]!;
    const sinpo = { s: 4, i: 4, n: 3, p: 3, o: 3 } as const;
    const heard = { ...fields, outcome: 'heard', sinpo, remarks: 'weak' } as const;
    await saveEdit(log, id, heard, Date.now() + 1);
    expect(await act()).toMatchObject({ kind: 'edited', entry: { id } });
    await log.writer.edit('reception', id, { remarks: 'weak, then gone' });
    await undo(log, outing.id, (await act())!, Date.now());
    const [undone] = await readEntries(log, outing.id);
    expect(undone!.fields).toEqual({ ...fields, remarks: 'weak, then gone' });
    expect(await act()).toMatchObject({ kind: 'entry', entry: { id } });
  });

  it('should not be an edit that changed nothing', async () => {
    const id = await nilIn(log, outing);
    const { fields } = (await readEntries(log, outing.id))[0]!;
    await saveEdit(log, id, fields, Date.now() + 1);
    expect((await readOutingMemory(log, outing.id)).act).toBeNull();
  });

  it('should tell when an entry was made from its id', () => {
    const id = log.writer.newId();
    expect(Math.abs(madeAtMs(id) - Date.now())).toBeLessThan(1000);
  });
});
