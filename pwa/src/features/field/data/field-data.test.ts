// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import { RECORD_SCHEMAS } from '@harkmoor/sync-model/records/schemas';
import { openGuestLog, type OpenLog } from '../../../store/open-log';
import { receptionFromPad, saveWords } from '../pad-values';
import { padAddress } from '../pad-address';
import { padForFrequency, padForSameAgain } from '../pad-paths';
import { binEntry, logTap, saveEdit, saveNewEntry } from './entry-writer';
import { readOutingMemory } from './field-settings';
import { lastActOf, madeAtMs, undo } from './last-act';
import { readEntries } from './outing-entries';
import { endOuting, mendSetup, startOuting, switchSetup } from './outing-writer';
import { keepPadDraft, readOpenDrafts } from './pad-drafts';
import { readPadStart } from './pad-start';
import { quickStart, sharedPlaceOf, type QuickStart } from './quick-start';
import { readOwnOutings, type StoredOuting } from './running-outing';

const QUICK: QuickStart = {
  siteName: 'Ravnklit dune',
  environment: 'rural',
  place: { kind: 'locator', locator: 'JO46ac', atMs: Date.UTC(2026, 10, 12) },
  receiverName: 'My receiver',
  antennaName: 'Whip',
  antennaKind: 'whip',
  setupId: null,
};

let log: OpenLog;
let outing: StoredOuting;

async function freshOuting(): Promise<void> {
  log = await openGuestLog();
  await Promise.all(
    log.database.tables
      .filter(({ name }) => !['clubs', 'settings'].includes(name))
      .map((table) => table.clear()),
  );
  await quickStart(log, QUICK, Date.now());
  outing = (await readOwnOutings(log, Date.now())).running!;
}

async function openPad(path: string) {
  const start = await readPadStart(log, padAddress(new URL(path, 'http://phone').search));
  if (start.kind !== 'ready') throw new Error(`the pad is ${start.kind}`);
  return start;
}

function plannedPad(atMs = Date.now(), draft = log.writer.newId()): string {
  return padForFrequency({ dialHz: 6_070_000, mode: 'AM', means: 'planned', targetId: null }, atMs, draft);
}

async function nil(setupOf = outing): Promise<string> {
  const subject = { kind: 'frequency', dialHz: 5_000_000, mode: 'AM', basis: 'planned' } as const;
  return logTap(log, {
    outcome: 'nil',
    subject,
    outingId: outing.id,
    outing: setupOf.fields,
    deviceAtMs: Date.now(),
  });
}

const current = async () => (await readOwnOutings(log, Date.now())).running!;

beforeEach(freshOuting);

describe('the first outing', () => {
  it('should make everything it needs at once, each record valid', async () => {
    for (const type of ['site', 'site-fix', 'receiver', 'antenna', 'setup', 'outing'] as const) {
      const records = await log.database.recordTable(type).toArray();
      expect(records).toHaveLength(1);
      expect(RECORD_SCHEMAS[type].safeParse(records[0]!.fields).error).toBeUndefined();
    }
  });

  it('should share a typed square no finer than its surroundings allow, and never finer than typed', () => {
    const typed = { kind: 'locator', locator: 'JO46ac', atMs: 0 } as const;
    expect(sharedPlaceOf(typed, 'rural')).toEqual({ locator: 'JO46ac' });
    expect(sharedPlaceOf(typed, 'city')).toEqual({ locator: 'JO46' });
    expect(sharedPlaceOf({ ...typed, locator: 'JO46' }, 'rural')).toEqual({ locator: 'JO46' });
  });

  it('should keep the exact fix in the person’s own log alone', async () => {
    const [fix] = await log.database.recordTable('site-fix').toArray();
    expect(fix!.clubId).toBe(log.myLogId);
    const [site] = await log.database.recordTable('site').toArray();
    expect(JSON.stringify(site)).not.toContain('latDeg');
  });
});

describe('an outing', () => {
  it('should end when the next one starts, and when it is ended by hand', async () => {
    const { siteId, setupIds, currentSetupId } = outing.fields;
    await startOuting(log, { siteId, setupIds, currentSetupId, targetListId: null }, Date.now());
    const first = await log.database.recordTable('outing').get([log.clubId, outing.id]);
    expect(first!.fields.ended?.by).toBe('next');
    await endOuting(log, await current(), Date.now(), 'hand');
    const { running, newest } = await readOwnOutings(log, Date.now());
    expect(running).toBeNull();
    expect(newest!.fields.ended?.by).toBe('hand');
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

describe('what can be taken back', () => {
  it('should be the newest entry, then its way out of the bin, and nothing older after that', async () => {
    await nil();
    const second = await nil();
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
    const ids = [await nil(), await nil(), await nil()];
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

  it('should tell when an entry was made from its id', () => {
    const id = log.writer.newId();
    expect(Math.abs(madeAtMs(id) - Date.now())).toBeLessThan(1000);
  });
});

describe('the setup switch', () => {
  it('should hold for entries from now, and take a new setup along', async () => {
    await nil();
    const other = log.writer.newId();
    await switchSetup(log, outing, other, { atMs: Date.now(), roundNo: 1 });
    const now = await current();
    expect(now.fields.setupIds).toEqual([outing.fields.currentSetupId, other]);
    await nil(now);
    const setups = (await readEntries(log, outing.id)).map(({ fields }) => fields.setupId);
    expect(setups).toEqual([outing.fields.currentSetupId, other]);
  });
});

describe('the pad', () => {
  it('should count nothing before it is saved, and then the moment of the tap', async () => {
    const atMs = Date.now() - 60_000;
    const draft = log.writer.newId();
    const { base, values, outlined } = await openPad(plannedPad(atMs, draft));
    await keepPadDraft(log, { ...values, scores: { sinpo: { s: 4 } } }, Date.now());
    expect(await readEntries(log, outing.id)).toEqual([]);
    const again = await openPad(plannedPad(atMs, draft));
    expect(again.values.scores.sinpo).toEqual({ s: 4 });
    expect(saveWords(base, again.values, outlined)).toBe('Save 4XXXX');
    const fields = receptionFromPad(base, again.values, outlined);
    expect(RECORD_SCHEMAS.reception.safeParse(fields).error).toBeUndefined();
    await saveNewEntry(log, draft, fields);
    const [entry] = await readEntries(log, outing.id);
    expect(entry).toMatchObject({
      id: draft,
      fields: { deviceAt: atMs, basis: 'planned', outcome: 'heard' },
    });
    expect(await readOpenDrafts(log)).toEqual([]);
  });

  it('should not offer a draft again whose entry was saved just before the phone died', async () => {
    const draft = log.writer.newId();
    const { base, values, outlined } = await openPad(plannedPad(Date.now(), draft));
    await log.writer.create('reception', receptionFromPad(base, values, outlined), { id: draft });
    await keepPadDraft(log, values, Date.now());
    expect(await readOpenDrafts(log)).toEqual([]);
    const start = await readPadStart(log, padAddress(new URL(values.path, 'http://phone').search));
    expect(start.kind).toBe('saved');
  });

  it('should show old scores as outlines at Same again, and count only what is touched', async () => {
    const first = log.writer.newId();
    const pad = await openPad(plannedPad(Date.now(), first));
    const scored = {
      ...pad.values,
      scores: { sinpo: { s: 4, i: 4, n: 3, p: 3, o: 3 }, meter: { s: 7, overDb: 0 } },
    } as const;
    await saveNewEntry(log, first, receptionFromPad(pad.base, scored, pad.outlined));
    const [before] = await readEntries(log, outing.id);
    const again = await openPad(padForSameAgain(before!, { inRound: null }, Date.now(), log.writer.newId()));
    expect(again.outlined.sinpo).toEqual({ s: 4, i: 4, n: 3, p: 3, o: 3 });
    expect(saveWords(again.base, again.values, again.outlined)).toBe('Save heard, no scores');
    const untouched = receptionFromPad(again.base, again.values, again.outlined);
    expect(untouched.carried).toEqual(['sinpo', 'meter']);
    const touched = { ...again.values, scores: { sinpo: { s: 5 as const } } };
    expect(receptionFromPad(again.base, touched, again.outlined)).toMatchObject({
      sinpo: { s: 5, i: 'X', n: 'X', p: 'X', o: 'X' },
      carried: ['meter'],
    });
  });

  it('should take the scores away when an entry turns into a nil, and bring a nil to heard', async () => {
    const id = await nil();
    const { base, values, outlined } = await openPad(`/field/pad?receptionId=${id}`);
    const heard = receptionFromPad(
      base,
      { ...values, outcome: 'heard', scores: { sinpo: { o: 2 } } },
      outlined,
    );
    await saveEdit(log, id, heard);
    const edited = await openPad(`/field/pad?receptionId=${id}`);
    expect(edited.values).toMatchObject({ outcome: 'heard', scores: { sinpo: { s: 'X', o: 2 } } });
    const nilAgain = receptionFromPad(edited.base, { ...edited.values, outcome: 'nil' }, edited.outlined);
    expect(nilAgain).toMatchObject({ outcome: 'nil', sinpo: null, meter: null });
    expect(RECORD_SCHEMAS.reception.safeParse(nilAgain).success).toBe(true);
  });

  it('should keep only what records may hold of what was typed', async () => {
    const { base, values, outlined } = await openPad(plannedPad());
    const typed = {
      ...values,
      remarks: '  fading\u0007 e\u0301 ',
      programmeText: ' news ',
      programmeAt: values.atMs,
    };
    const fields = receptionFromPad(base, typed, outlined);
    expect(fields.remarks).toBe('fading \u00e9');
    expect(fields.programme).toEqual([{ at: values.atMs, text: 'news' }]);
    expect(RECORD_SCHEMAS.reception.safeParse(fields).success).toBe(true);
  });

  it('should say what is wrong where its address leads to nothing', async () => {
    for (const search of [
      '',
      '?receptionId=x',
      '?draft=a&atMs=1&means=round&targetId=none',
      '?atMs=<script>',
    ]) {
      expect((await readPadStart(log, padAddress(search))).kind).toBe('gone');
    }
  });

  it('should leave a binned entry to the bin', async () => {
    const id = await nil();
    await binEntry(log, { id, outingId: outing.id }, Date.now());
    expect((await readPadStart(log, padAddress(`?receptionId=${id}`))).kind).toBe('gone');
  });
});
