import { STAMP_AHEAD_MS_MAX } from '@harkmoor/sync-model/stamp/stamp';
import { feedRecordOfHistory } from '@harkmoor/sync-model/hub/feed-record';
import { EVENING_MS, stampAt, TestHub, TestPhone } from './hub.js';
import { edit, newRecord, sampleOfEachType } from './sample-records.js';

let hub: TestHub;
beforeAll(async () => {
  hub = await TestHub.open();
});
afterAll(() => hub.close());

async function member() {
  return hub.newMember(await hub.addClub(), 'organizer');
}

const historyOf = (phone: TestPhone) =>
  hub.rows<{
    field: string;
    clash: boolean;
    seq: string | null;
    replaced_value: unknown;
    kept_value: unknown;
  }>('select * from history where club_id = ? order by at, id', [phone.clubId]);

describe('the history of fields', () => {
  it('should hold what an edit replaced, and send only clashes to the phones', async () => {
    const phone = await member();
    const { receiver, antenna, setup } = sampleOfEachType();
    await phone.push(receiver, antenna, setup);
    await phone.push(edit(antenna, { notes: null }, stampAt(EVENING_MS + 1)));
    await phone.push(edit(antenna, { notes: 'Thick.' }, stampAt(EVENING_MS + 2, 'phone002')));
    const rows = await historyOf(phone);
    expect(
      rows.map(({ field, clash, replaced_value, kept_value }) => ({
        field,
        clash,
        replaced_value,
        kept_value,
      })),
    ).toEqual([
      { field: 'notes', clash: false, replaced_value: 'Thin.', kept_value: null },
      { field: 'notes', clash: true, replaced_value: null, kept_value: 'Thick.' },
    ]);
    expect(rows.map(({ seq }) => seq !== null)).toEqual([false, true]);
    const feed = await (await hub.newMember(phone.clubId)).pull();
    const sent = feed.filter(({ type }) => type === 'history');
    expect(sent).toHaveLength(1);
    expect(sent[0]!.fields.replaced).toEqual({ value: null, stamp: stampAt(EVENING_MS + 1) });
  });

  it('should send a row exactly as the sync model says it', async () => {
    const phone = await member();
    const { antenna } = sampleOfEachType();
    await phone.push(antenna);
    await phone.push(
      edit(antenna, { lengthM: 5 }, stampAt(EVENING_MS + 2, 'phone002'), stampAt(EVENING_MS - 1)),
    );
    const [row] = await hub.rows<Record<string, string | number | boolean | null>>(
      'select * from history where club_id = ?',
      [phone.clubId],
    );
    const feed = await (await hub.newMember(phone.clubId)).pull();
    expect(feed.find(({ type }) => type === 'history')).toEqual(
      feedRecordOfHistory({
        id: String(row!.id),
        recordType: 'antenna',
        recordId: antenna.id,
        field: 'lengthM',
        replaced: { value: 20.5, stamp: antenna.at },
        kept: { value: 5, stamp: stampAt(EVENING_MS + 2, 'phone002') },
        clash: true,
        byId: phone.accountId,
        seq: Number(row!.seq),
        at: Number(row!.at),
      }),
    );
  });

  it('should keep at most 200 rows of a record, and drop the oldest without a clash first', async () => {
    const phone = await member();
    const { antenna } = sampleOfEachType();
    await phone.push(antenna);
    const clash = edit(antenna, { lengthM: 1 }, stampAt(EVENING_MS + 1, 'phone002'), stampAt(EVENING_MS - 1));
    await phone.push(clash);
    let base = clash.at;
    for (let n = 2; n <= 211; n++) {
      const at = stampAt(EVENING_MS + n);
      await phone.push(edit(antenna, { lengthM: n }, at, base));
      base = at;
    }
    const rows = await historyOf(phone);
    expect(rows).toHaveLength(200);
    expect(rows.filter((row) => row.clash).map(({ kept_value }) => kept_value)).toEqual([1]);
    expect(rows.at(-1)!.kept_value).toBe(211);
  });
});

describe('gear and sites that something refers to', () => {
  it.each(['site', 'receiver', 'antenna', 'setup'] as const)(
    'should be retired where a %s is deleted',
    async (type) => {
      const phone = await member();
      const { ['site-fix']: _fix, ...sample } = sampleOfEachType();
      await phone.push(...Object.values(sample));
      const { results } = await phone.push(
        edit(sample[type], { deleted: true, retiredAt: null }, stampAt(EVENING_MS + 5)),
      );
      expect(results).toMatchObject([{ status: 'applied' }]);
      const feed = await (await hub.newMember(phone.clubId)).pull();
      const record = feed.find(({ id }) => id === sample[type].id)!;
      expect(record.fields.deleted).toBe(false);
      expect(record.fields.retiredAt).toEqual(expect.any(Number));
    },
  );

  it('should be deleted where nothing refers to them, also where another club’s records bear the same ids', async () => {
    const other = await member();
    const { ['site-fix']: _fix, ...sample } = sampleOfEachType();
    await other.push(...Object.values(sample));
    const phone = await member();
    await phone.push(sample.receiver, sample.antenna, sample.site);
    for (const type of ['site', 'receiver', 'antenna'] as const) {
      await phone.push(edit(sample[type], { deleted: true }, stampAt(EVENING_MS + 5)));
      const [row] = await hub.rows<{ deleted: boolean }>(
        `select deleted from ${type} where club_id = ? and id = ?`,
        [phone.clubId, sample[type].id],
      );
      expect(row).toEqual({ deleted: true });
    }
  });
});

describe('a clock that is ahead', () => {
  it('should apply nothing of the round and tell the time', async () => {
    const phone = await member();
    const early = newRecord('antenna', { name: 'Wire', kind: 'wire', sharedUse: false });
    const ahead = newRecord(
      'antenna',
      { name: 'Whip', kind: 'whip', sharedUse: false },
      stampAt(Date.now() + STAMP_AHEAD_MS_MAX + 60_000),
    );
    const before = await hub.seqOf(phone.clubId);
    const answer = await phone.round([early, ahead]);
    expect(answer).toMatchObject({ code: 'clock-ahead', clubs: [] });
    expect(Math.abs(answer.serverTime - Date.now())).toBeLessThan(10_000);
    expect(await hub.seqOf(phone.clubId)).toBe(before);
    expect(await hub.rows('select 1 from antenna where club_id = ?', [phone.clubId])).toEqual([]);
  });
});
