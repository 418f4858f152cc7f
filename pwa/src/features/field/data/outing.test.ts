// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import { clockTrust } from '@harkmoor/sync-model/evidence/clock-trust';
import type { OpenLog } from '../../../store/open-log';
import { readOwnChecks, saveClockCheck } from './clock-checks';
import { readEntries } from './outing-entries';
import { nilIn, outingOnAPhone } from './outing-on-a-phone';
import { endOuting, noteClockStep, startOuting, switchSetup } from './outing-writer';
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

describe('a jump of the clock', () => {
  it('should outdate the checks made before it, also those whose minute comes a second time, and no later one', async () => {
    const nowMs = Date.now();
    const check = { offsetMs: 86, uncertaintyMs: 500, method: 'server', pathKm: null } as const;
    await saveClockCheck(log, { ...check, deviceAt: nowMs });
    expect(await readOwnChecks(log, nowMs)).toHaveLength(1);
    const putBack = { at: nowMs - 420_000, stepMs: -420_000 };
    await noteClockStep(log, outing, putBack);
    const { clockSteps } = (await running()).fields;
    expect(clockTrust(await readOwnChecks(log, putBack.at), clockSteps, putBack.at).kind).toBe('stepped');
    await saveClockCheck(log, { ...check, deviceAt: putBack.at + 60_000, offsetMs: 420_086 });
    const trust = clockTrust(await readOwnChecks(log, putBack.at), clockSteps, putBack.at + 60_000);
    expect(trust).toMatchObject({ kind: 'checked', check: { offsetMs: 420_086 } });
  });
});
