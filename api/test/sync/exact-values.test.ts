import fc from 'fast-check';
import { textSchema } from '@harkmoor/sync-model/records/common-fields';
import { TestHub, type TestPhone } from './hub.js';
import { newRecord, siteFixFields } from './sample-records.js';

let hub: TestHub;
let writer: TestPhone;
beforeAll(async () => {
  hub = await TestHub.open();
  writer = await hub.newMember(await hub.addClub('my-log'));
});
afterAll(() => hub.close());

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const notes = fc
  .string({ unit: 'binary', maxLength: 200 })
  .map((text) => text.normalize('NFC'))
  .filter((text) => textSchema(4000).safeParse(text).success);

it('should give back every number and text exactly as it was sent', async () => {
  await fc.assert(
    fc.asyncProperty(
      between(0.01, 5000),
      between(-90, 90),
      between(-180, 180),
      notes,
      async (lengthM, latDeg, lonDeg, text) => {
        const antenna = newRecord('antenna', {
          name: 'Wire',
          kind: 'wire',
          sharedUse: false,
          lengthM,
          notes: text,
        });
        const fix = newRecord('site-fix', siteFixFields(latDeg, lonDeg));
        const cursor = await hub.seqOf(writer.clubId);
        await writer.push(antenna, fix);
        const reader = Object.assign(Object.create(writer) as TestPhone, { cursor });
        const feed = await reader.pull();
        // −0 and 0 are one number in JSON
        expect(feed.map(({ fields }) => fields)).toEqual(
          JSON.parse(JSON.stringify([antenna.fields, fix.fields])),
        );
      },
    ),
    { numRuns: 150 },
  );
});
