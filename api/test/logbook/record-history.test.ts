import { v7 } from 'uuid';
import type { Change } from '@harkmoor/sync-model/protocol/messages';
import { PROTOCOL_VERSION } from '@harkmoor/sync-model/protocol/version';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, type Person } from '../people.js';
import { EVENING_MS, stampAt } from '../sync/hub.js';
import { edit, newRecord } from '../sync/sample-records.js';

const mail = new MailCatcher();
let server: TestApp;
let owner: Person;
let other: Person;
let clubId: string;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start() });
  owner = await makePerson(server, mail, 'Inger Marsk');
  other = await makePerson(server, mail, 'Bo Revle');
  const founded = await foundClub(owner);
  clubId = founded.clubId;
  await other.visitor.post('/api/clubs/join', { code: founded.code });
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

async function round(person: Person, changes: Change[]): Promise<void> {
  const clubs = [{ clubId, historyId: null, cursor: 0, changes }];
  const request = { protocol: PROTOCOL_VERSION, deviceId: 'phone001', sentAt: Date.now(), clubs };
  expect((await person.visitor.post('/api/sync', request)).status).toBe(200);
}

describe('the history of a record', () => {
  it('should be shown to members alone', async () => {
    const record = newRecord('antenna', { name: 'Whip', kind: 'whip', sharedUse: false });
    await round(owner, [record]);
    await round(owner, [edit(record, { notes: 'Bent.' }, stampAt(EVENING_MS + 9))]);
    const path = `/api/clubs/${clubId}/records/antenna/${record.id}/history`;
    const { status, body } = await other.visitor.get(path);
    expect(status).toBe(200);
    expect(body).toEqual({
      rows: [
        {
          id: expect.any(String) as string,
          field: 'notes',
          replaced: { value: null, stamp: record.at },
          kept: { value: 'Bent.', stamp: stampAt(EVENING_MS + 9) },
          byId: owner.accountId,
          clash: false,
          at: expect.any(Number) as number,
        },
      ],
    });
    const stranger = await makePerson(server, mail, 'Kit Lyng');
    const refused = await stranger.visitor.get(path);
    const unknown = await stranger.visitor.get(`/api/clubs/${v7()}/records/antenna/${record.id}/history`);
    expect([refused.status, refused.body.code]).toEqual([404, 'not-found']);
    expect({ ...unknown.body, requestId: '' }).toEqual({ ...refused.body, requestId: '' });
  });
});
