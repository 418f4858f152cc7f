import { v7 } from 'uuid';
import { EVENING_MS, stampAt, TestHub, TestPhone } from './hub.js';
import { edit, newRecord } from './sample-records.js';

const WRITERS = 8;
const ROUNDS_PER_WRITER = 12;
const CHANGES_PER_ROUND = 20;
const PAIRS = 200;

let hub: TestHub;
beforeAll(async () => {
  hub = await TestHub.open();
});
afterAll(() => hub.close());

const antenna = (name: string) => newRecord('antenna', { name, kind: 'wire', sharedUse: false });

it('should give every row a seq of its own and hide none behind a reader’s cursor, with 8 writers at once', async () => {
  const clubId = await hub.addClub();
  const writers = await Promise.all(Array.from({ length: WRITERS }, () => hub.newMember(clubId)));
  const reader = await hub.newMember(clubId);
  const seen: number[] = [];
  let isWriting = true;
  const reading = (async () => {
    for (let isLast = false; !isLast;) {
      isLast = !isWriting;
      for (const { seq } of await reader.pull()) seen.push(seq);
    }
  })();
  await Promise.all(
    writers.map(async (writer, index) => {
      for (let round = 0; round < ROUNDS_PER_WRITER; round++) {
        const changes = Array.from({ length: CHANGES_PER_ROUND }, (_, n) =>
          antenna(`${index}-${round}-${n}`),
        );
        const { results } = await writer.push(...changes);
        expect(results.every(({ status }) => status === 'applied')).toBe(true);
      }
    }),
  );
  isWriting = false;
  await reading;
  const members = WRITERS + 1;
  const count = WRITERS * ROUNDS_PER_WRITER * CHANGES_PER_ROUND + members;
  expect(await hub.seqOf(clubId)).toBe(count);
  expect(seen).toEqual([...seen].sort((a, b) => a - b));
  expect(new Set(seen)).toEqual(new Set(Array.from({ length: count }, (_, n) => n + 1)));
});

it('should keep both edits of two rounds on different fields of one record at once, 200 times', async () => {
  const clubId = await hub.addClub();
  const owner = await hub.newMember(clubId);
  const records = Array.from({ length: PAIRS }, (_, n) => antenna(`Wire ${n}`));
  await owner.push(...records);
  const secondPhone = new TestPhone(hub, owner.accountId, clubId);
  await Promise.all(
    records.flatMap((record) => [
      owner.round([edit(record, { lengthM: 21 }, stampAt(EVENING_MS + 10, 'phone001'))]),
      secondPhone.round([edit(record, { heightM: 7 }, stampAt(EVENING_MS + 20, 'phone002'))]),
    ]),
  );
  const [row] = await hub.rows<{ both: string }>(
    'select count(*) as both from antenna where club_id = ? and length_m = 21 and height_m = 7',
    [clubId],
  );
  expect(Number(row!.both)).toBe(PAIRS);
  // neither phone had missed anything of the field it changed
  expect(await hub.rows('select 1 from history where club_id = ? and clash', [clubId])).toEqual([]);
});

it('should let the later stamp win where two rounds meet on one field, and travel as a clash', async () => {
  const clubId = await hub.addClub();
  const owner = await hub.newMember(clubId);
  const record = antenna('Wire');
  await owner.push(record);
  const earlier = edit(record, { lengthM: 1 }, stampAt(EVENING_MS + 10, 'phone001'));
  const later = edit(record, { lengthM: 2 }, stampAt(EVENING_MS + 20, 'phone002'));
  await Promise.all([owner.round([earlier]), new TestPhone(hub, owner.accountId, clubId).round([later])]);
  const reader = await hub.newMember(clubId);
  const feed = await reader.pull();
  expect(feed.find(({ id }) => id === record.id)!.fields.lengthM).toBe(2);
  const clashes = feed.filter(({ type }) => type === 'history');
  expect(clashes).toHaveLength(1);
  expect(clashes[0]!.fields).toMatchObject({
    recordType: 'antenna',
    recordId: record.id,
    field: 'lengthM',
    replaced: { value: 1, stamp: earlier.at },
    kept: { value: 2, stamp: later.at },
    byId: owner.accountId,
    clash: true,
  });
});

it('should take a membership that ends in the middle of a round as ended for the next one', async () => {
  const clubId = await hub.addClub();
  const phone = await hub.newMember(clubId);
  const [first] = await Promise.all([
    phone.round([antenna('Wire')]),
    hub.rows('update membership set left_at = 1 where club_id = ? and account_id = ?', [
      clubId,
      phone.accountId,
    ]),
  ]);
  expect(first.clubs.length + first.goneClubs.length).toBe(1);
  expect((await phone.round([antenna(v7())])).goneClubs).toEqual([clubId]);
});
