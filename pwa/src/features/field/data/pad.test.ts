// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import { RECORD_SCHEMAS } from '@harkmoor/sync-model/records/schemas';
import type { OpenLog } from '../../../store/open-log';
import { padAddress } from '../pad-address';
import { padForSameAgain } from '../pad-paths';
import { receptionFromPad, saveWords } from '../pad-values';
import { binEntry, saveEdit, saveNewEntry } from './entry-writer';
import { readEntries } from './outing-entries';
import { nilIn, openPad, outingOnAPhone, plannedPad } from './outing-on-a-phone';
import { keepPadDraft, readOpenDrafts } from './pad-drafts';
import { readPadStart } from './pad-start';
import type { StoredOuting } from './running-outing';

let log: OpenLog;
let outing: StoredOuting;

beforeEach(async () => {
  ({ log, outing } = await outingOnAPhone());
});

describe('the pad', () => {
  it('should count nothing before it is saved, and then the moment of the tap', async () => {
    const atMs = Date.now() - 60_000;
    const draft = log.writer.newId();
    const { base, values, outlined } = await openPad(log, plannedPad(log, atMs, draft));
    await keepPadDraft(log, { ...values, scores: { sinpo: { s: 4 } } }, Date.now());
    expect(await readEntries(log, outing.id)).toEqual([]);
    const again = await openPad(log, plannedPad(log, atMs, draft));
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
    const { base, values, outlined } = await openPad(log, plannedPad(log, Date.now(), draft));
    await log.writer.create('reception', receptionFromPad(base, values, outlined), { id: draft });
    await keepPadDraft(log, values, Date.now());
    expect(await readOpenDrafts(log)).toEqual([]);
    const start = await readPadStart(log, padAddress(new URL(values.path, 'http://phone').search));
    expect(start.kind).toBe('saved');
  });

  it('should show old scores as outlines at Same again, and count only what is touched', async () => {
    const first = log.writer.newId();
    const pad = await openPad(log, plannedPad(log, Date.now(), first));
    const scored = {
      ...pad.values,
      scores: { sinpo: { s: 4, i: 4, n: 3, p: 3, o: 3 }, meter: { s: 7, overDb: 0 } },
    } as const;
    await saveNewEntry(log, first, receptionFromPad(pad.base, scored, pad.outlined));
    const [before] = await readEntries(log, outing.id);
    const again = await openPad(
      log,
      padForSameAgain(before!, { inRound: null }, Date.now(), log.writer.newId()),
    );
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
    const id = await nilIn(log, outing);
    const { base, values, outlined } = await openPad(log, `/field/pad?receptionId=${id}`);
    const heard = receptionFromPad(
      base,
      { ...values, outcome: 'heard', scores: { sinpo: { o: 2 } } },
      outlined,
    );
    await saveEdit(log, id, heard, Date.now());
    const edited = await openPad(log, `/field/pad?receptionId=${id}`);
    expect(edited.values).toMatchObject({ outcome: 'heard', scores: { sinpo: { s: 'X', o: 2 } } });
    const nilAgain = receptionFromPad(edited.base, { ...edited.values, outcome: 'nil' }, edited.outlined);
    expect(nilAgain).toMatchObject({ outcome: 'nil', sinpo: null, meter: null });
    expect(RECORD_SCHEMAS.reception.safeParse(nilAgain).success).toBe(true);
  });

  it('should keep only what records may hold of what was typed', async () => {
    const { base, values, outlined } = await openPad(log, plannedPad(log));
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
    const id = await nilIn(log, outing);
    await binEntry(log, { id, outingId: outing.id }, Date.now());
    expect((await readPadStart(log, padAddress(`?receptionId=${id}`))).kind).toBe('gone');
  });
});
