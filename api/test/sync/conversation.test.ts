import { WRITABLE_TYPES, type WritableType } from '@harkmoor/sync-model/records/record-types';
import { EVENING_MS, stampAt, TestHub, type TestPhone } from './hub.js';
import { edit, sampleOfEachType, type Sample } from './sample-records.js';

/** Each type with an edit of one of its fields. */
const EDITS: Readonly<Record<WritableType, Record<string, unknown>>> = {
  site: { name: 'Ravnklit dune, north' },
  'site-fix': { home: true },
  receiver: { meterScale: { kind: 'dbm', s9Dbm: -73, dbPerS: 6, calibrated: true } },
  antenna: { lengthM: null },
  setup: { attenuationDb: 20 },
  'target-list': { edition: 'A27' },
  target: { schedule: 'always' },
  outing: { ended: null },
  'swap-test': { ended: { at: EVENING_MS + 5, reason: 'stopped' } },
  reception: { sinpo: { s: 5, i: 5, n: 5, p: 4, o: 5 } },
  'clock-check': { pathKm: null },
  'dial-check': { temperatureC: 21 },
  'noise-reading': { meter: { s: 3, overDb: 0 } },
  attachment: { caption: null },
};

let hub: TestHub;
beforeAll(async () => {
  hub = await TestHub.open();
});
afterAll(() => hub.close());

/** Exact fixes live in My log alone, where there is no other member: a second phone of the owner pulls. */
async function twoPhones(type: WritableType): Promise<{ writer: TestPhone; reader: TestPhone }> {
  const clubId = await hub.addClub(type === 'site-fix' ? 'my-log' : 'club');
  const writer = await hub.newMember(clubId, 'organizer');
  const reader =
    type === 'site-fix' ? Object.assign(Object.create(writer), { cursor: 0 }) : await hub.newMember(clubId);
  return { writer, reader };
}

function withParents(sample: Sample, type: WritableType) {
  return WRITABLE_TYPES.slice(0, WRITABLE_TYPES.indexOf(type))
    .filter((parent) => parent !== 'site-fix')
    .map((parent) => sample[parent]);
}

describe.each(WRITABLE_TYPES)('a conversation about a %s', (type) => {
  it('should reach another phone as it was sent, be edited, deleted, and not change when repeated', async () => {
    const { writer, reader } = await twoPhones(type);
    const sample = sampleOfEachType();
    const record = sample[type];
    const results = (await writer.push(...withParents(sample, type), record)).results;
    expect(results.filter(({ status }) => status !== 'applied')).toEqual([]);

    const first = (await reader.pull()).find(({ id, type: t }) => id === record.id && t === type)!;
    expect(first).toEqual({
      type,
      id: record.id,
      ownerId: writer.accountId,
      seq: first.seq,
      at: record.at,
      fields: record.fields,
    });

    const change = edit(record, EDITS[type], stampAt(EVENING_MS + 10));
    await writer.push(change);
    const [edited] = await reader.pull();
    const [[field, value]] = Object.entries(EDITS[type]) as [[string, unknown]];
    expect(edited).toMatchObject({ id: record.id, at: record.at, stamps: { [field]: change.at } });
    expect(edited!.fields[field] ?? null).toEqual(value);
    expect(await reader.pull()).toEqual([]);

    const seq = await hub.seqOf(writer.clubId);
    const rows = await hub.rows('select count(*) from history where club_id = ?', [writer.clubId]);
    const again = await writer.push(...withParents(sample, type), record, change);
    expect(again.results.map(({ status }) => status)).not.toContain('refused');
    expect(await hub.seqOf(writer.clubId)).toBe(seq);
    expect(await hub.rows('select count(*) from history where club_id = ?', [writer.clubId])).toEqual(rows);
    expect(await reader.pull()).toEqual([]);

    await writer.push(edit(record, { deleted: true }, stampAt(EVENING_MS + 20)));
    const [deleted] = await reader.pull();
    expect(deleted).toMatchObject({ id: record.id, fields: { deleted: true } });
  });
});
