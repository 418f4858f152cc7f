import { Membership } from '../../src/clubs/membership.entity.js';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, makeUnconfirmed, type Person } from '../people.js';

const mail = new MailCatcher();
let server: TestApp;
let admin: Person;
let second: Person;
let clubId: string;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start() });
  admin = await makePerson(server, mail, 'Inger Marsk');
  second = await makePerson(server, mail, 'Bo Revle');
});
beforeEach(async () => {
  const founded = await foundClub(admin);
  clubId = founded.clubId;
  await second.visitor.post('/api/clubs/join', { code: founded.code });
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

const setRole = (by: Person, of: Person, role: string) =>
  by.visitor.patch(`/api/clubs/${clubId}/members/${of.accountId}`, { role });

test('should make the founder admin and whoever joins by code a member', async () => {
  const { body } = await second.visitor.get(`/api/clubs/${clubId}/members`);
  expect(body.members).toEqual([
    { accountId: second.accountId, name: 'Bo Revle', role: 'member', joinedAt: expect.any(Number) as number },
    {
      accountId: admin.accountId,
      name: 'Inger Marsk',
      role: 'admin',
      joinedAt: expect.any(Number) as number,
    },
  ]);
  expect(JSON.stringify(body)).not.toContain('@');
  const mine = await second.visitor.get('/api/accounts/me');
  const clubs = mine.body.clubs as { clubId: string; role: string }[];
  expect(clubs.find((club) => club.clubId === clubId)?.role).toBe('member');
});

test('should let a change of role hold at the very next request', async () => {
  expect((await second.visitor.post(`/api/clubs/${clubId}/join-code`)).status).toBe(403);
  expect((await setRole(admin, second, 'admin')).body.role).toBe('admin');
  expect((await second.visitor.post(`/api/clubs/${clubId}/join-code`)).status).toBe(201);
  expect((await setRole(second, admin, 'member')).status).toBe(200);
  expect((await setRole(admin, second, 'member')).status).toBe(403);
});

test('should keep the last admin, also where two admins step down at once', async () => {
  const last = await setRole(admin, admin, 'member');
  expect([last.status, last.body.code]).toEqual([409, 'last-admin']);
  const connection = server.orm.em.getConnection();
  for (let time = 0; time < 20; time += 1) {
    await connection.execute(`update membership set role = 'admin' where club_id = ?`, [clubId]);
    const both = await Promise.all([setRole(admin, admin, 'member'), setRole(second, second, 'organizer')]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  }
});

test('should keep one admin where two admins demote each other at once', async () => {
  for (let time = 0; time < 10; time += 1) {
    const founded = await foundClub(admin);
    clubId = founded.clubId;
    await second.visitor.post('/api/clubs/join', { code: founded.code });
    await setRole(admin, second, 'admin');
    const answers = await Promise.all([setRole(admin, second, 'member'), setRole(second, admin, 'member')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 403]);
  }
});

test('should give each change of people the next place in the feed', async () => {
  await setRole(admin, second, 'organizer');
  const em = server.orm.em.fork();
  const before = await em.findOneOrFail(Membership, { clubId, accountId: second.accountId });
  await setRole(admin, second, 'organizer'); // nothing changes
  await setRole(admin, second, 'admin');
  const [club] = await em
    .getConnection()
    .execute<{ seq: string }[]>('select seq from club where club_id = ?', [clubId]);
  const after = await em.fork().findOneOrFail(Membership, { clubId, accountId: second.accountId });
  expect([before.seq, after.seq, Number(club!.seq)]).toEqual([3, 4, 4]);
  expect(after.stamp > before.stamp).toBe(true);
  expect(after.stamp).toMatch(/^[0-9a-f]{16}harkmoor$/);
});

test('should ask for a confirmed address to found and to invite, and for nothing else', async () => {
  const fresh = await makeUnconfirmed(server, `Fresh ${clubId.slice(-6)}`);
  const founding = await fresh.visitor.post('/api/clubs', { name: 'Own club', ituRegion: 2 });
  expect([founding.status, founding.body.code]).toEqual([403, 'unconfirmed']);
  const { body } = await admin.visitor.post(`/api/clubs/${clubId}/join-code`);
  expect((await fresh.visitor.post('/api/clubs/join', { code: body.code })).status).toBe(200);
  await setRole(admin, fresh, 'admin');
  const inviting = await fresh.visitor.post(`/api/clubs/${clubId}/join-code`);
  expect([inviting.status, inviting.body.code]).toEqual([403, 'unconfirmed']);
});

test('should tell no difference between a club of others and one that never was', async () => {
  const other = await foundClub(second, 'Not Ingers');
  const nowhere = '01a22fe4-a845-7498-a81b-56378b1c63d0';
  for (const path of ['', '/members']) {
    const [foreign, missing] = await Promise.all(
      [other.clubId, nowhere].map((id) => admin.visitor.get(`/api/clubs/${id}${path}`)),
    );
    expect(foreign!.status).toBe(404);
    expect({ ...foreign!.body, requestId: '' }).toEqual({ ...missing!.body, requestId: '' });
  }
});

test('should never share My log', async () => {
  const refused = await admin.visitor.post(`/api/clubs/${admin.myLogId}/join-code`);
  expect([refused.status, refused.body.code]).toEqual([403, 'forbidden']);
  const demoted = await admin.visitor.patch(`/api/clubs/${admin.myLogId}/members/${admin.accountId}`, {
    role: 'member',
  });
  expect(demoted.body.code).toBe('last-admin');
});
