import type { TestApp } from './app.js';
import { linkTokenOf, type MailCatcher } from './mail-catcher.js';
import { Visitor } from './visitor.js';

export const PASSWORD = 'seven grey gulls';

export type Person = {
  readonly visitor: Visitor;
  readonly accountId: string;
  readonly email: string;
  readonly name: string;
  readonly myLogId: string;
};

/** A person as one comes to be: signed up, confirmed by the link in the mail, signed in. */
export async function makePerson(server: TestApp, mail: MailCatcher, name: string): Promise<Person> {
  const email = `${name.toLowerCase().replace(/\W+/g, '.')}@harkmoor.test`;
  const visitor = new Visitor(server.url);
  await visitor.post('/api/accounts/sign-up', { name, email, password: PASSWORD });
  const token = linkTokenOf(await mail.mailTo(email), '/account/confirm');
  const confirmed = await visitor.post('/api/accounts/confirm', { token });
  if (confirmed.status !== 200) throw new Error(`confirming failed: ${confirmed.text}`);
  return signedIn(visitor, name, email);
}

/** The same without the click on the link. */
export async function makeUnconfirmed(server: TestApp, name: string): Promise<Person> {
  const email = `${name.toLowerCase().replace(/\W+/g, '.')}@harkmoor.test`;
  const visitor = new Visitor(server.url);
  await visitor.post('/api/accounts/sign-up', { name, email, password: PASSWORD });
  return signedIn(visitor, name, email);
}

async function signedIn(visitor: Visitor, name: string, email: string): Promise<Person> {
  const { status, body, text } = await visitor.signIn(email, PASSWORD);
  if (status !== 200) throw new Error(`signing in failed: ${text}`);
  const { account, clubs } = body as { account: { id: string }; clubs: { clubId: string }[] };
  return { visitor, accountId: account.id, email, name, myLogId: clubs[0]!.clubId };
}

/** A club founded by one person, and a code to it. */
export async function foundClub(
  admin: Person,
  name = 'Marram Circle',
): Promise<{ clubId: string; code: string }> {
  const founded = await admin.visitor.post('/api/clubs', { name, ituRegion: 1 });
  if (founded.status !== 201) throw new Error(`founding failed: ${founded.text}`);
  const clubId = founded.body.clubId as string;
  const { body } = await admin.visitor.post(`/api/clubs/${clubId}/join-code`);
  return { clubId, code: body.code as string };
}
