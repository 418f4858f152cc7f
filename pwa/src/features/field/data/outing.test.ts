// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import type { OpenLog } from '../../../store/open-log';
import { readEntries } from './outing-entries';
import { nilIn, outingOnAPhone } from './outing-on-a-phone';
import { endOuting, startOuting, switchSetup } from './outing-writer';
import { readOwnOutings, type StoredOuting } from './running-outing';

let log: OpenLog;
let outing: StoredOuting;
let running: () => Promise<StoredOuting>;

beforeEach(async () => {
  ({ log, outing, running } = await outingOnAPhone());
});

describe('an outing', () => {
  it('should end when the next one starts, and when it is ended by hand', async () => {
    const { siteId, setupIds, currentSetupId } = outing.fields;
    await startOuting(log, { siteId, setupIds, currentSetupId, targetListId: null }, Date.now());
    const first = await log.database.recordTable('outing').get([log.clubId, outing.id]);
    expect(first!.fields.ended?.by).toBe('next');
    await endOuting(log, await running(), Date.now(), 'hand');
    const after = await readOwnOutings(log, Date.now());
    expect(after.running).toBeNull();
    expect(after.newest!.fields.ended?.by).toBe('hand');
  });

  it('should be found again however long ago this phone began it', async () => {
    const { siteId, setupIds, currentSetupId } = outing.fields;
    await startOuting(
      log,
      { siteId, setupIds, currentSetupId, targetListId: null },
      Date.now() - 90 * 86_400_000,
    );
    const begun = (await readOwnOutings(log, Date.now())).running;
    expect(begun!.fields.startedAt).toBeLessThan(Date.now() - 89 * 86_400_000);
  });

  it('should not be taken for one’s own when another person runs it', async () => {
    const theirs = { ...outing, id: log.writer.newId(), ownerId: 'somebody-else' };
    await log.database.recordTable('outing').put(theirs);
    await endOuting(log, outing, Date.now(), 'hand');
    expect((await readOwnOutings(log, Date.now())).running).toBeNull();
  });
});

describe('the setup switch', () => {
  it('should hold for entries from now, and take a new setup along', async () => {
    await nilIn(log, outing);
    const other = log.writer.newId();
    await switchSetup(log, outing, other, { atMs: Date.now(), roundNo: 1 });
    const now = await running();
    expect(now.fields.setupIds).toEqual([outing.fields.currentSetupId, other]);
    await nilIn(log, now);
    const setups = (await readEntries(log, outing.id)).map(({ fields }) => fields.setupId);
    expect(setups).toEqual([outing.fields.currentSetupId, other]);
  });
});
