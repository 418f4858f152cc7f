import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { v7 as newId } from 'uuid';
import { Account } from '../../src/accounts/account.entity.js';
import { hashPassword } from '../../src/accounts/password.js';
import { Club } from '../../src/clubs/club.entity.js';
import { Membership } from '../../src/clubs/membership.entity.js';
import { foundClub } from '../../src/clubs/my-log.js';
import { DEMO_CLUB_NAME, DEMO_PASSWORD, DEMO_PEOPLE } from './demo-people.js';

/** Where each person of the demo writes to. */
export type DemoHome = { readonly accountId: string; readonly clubId: string; readonly myLogId: string };

/**
 * Makes the accounts and the club that are missing, in one transaction; a second call finds them. Returns homes by
 * the person's key.
 */
export async function ensureDemoAccounts(em: EntityManager, nowMs: number): Promise<Map<string, DemoHome>> {
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  return em.transactional(async (tx) => {
    const club =
      (await tx.findOne(Club, { name: DEMO_CLUB_NAME, demo: true })) ?? (await newDemoClub(tx, nowMs));
    const homes = new Map<string, DemoHome>();
    for (const { key, email, name, role } of DEMO_PEOPLE) {
      let account = await tx.findOne(Account, { email });
      if (!account) {
        account = new Account({ id: newId(), email, name, passwordHash, createdAt: nowMs });
        account.confirm(nowMs);
        tx.persist(account);
        foundClub(tx, account, { kind: 'my-log', name: 'My log', ituRegion: 1 }, nowMs);
        tx.persist(
          new Membership({ clubId: club.id, accountId: account.id, name, role, seq: club.takeSeq(), nowMs }),
        );
        await tx.flush();
      }
      const myLogId = await myLogOf(tx, account.id);
      homes.set(key, { accountId: account.id, clubId: club.id, myLogId });
    }
    return homes;
  });
}

/** Written before its members are: the mapper knows no relation between the two tables. */
async function newDemoClub(tx: EntityManager, nowMs: number): Promise<Club> {
  const club = new Club({
    id: newId(),
    kind: 'club',
    name: DEMO_CLUB_NAME,
    ituRegion: 1,
    demo: true,
    historyId: randomUUID(),
    nowMs,
  });
  await tx.persist(club).flush();
  return club;
}

async function myLogOf(tx: EntityManager, accountId: string): Promise<string> {
  const memberships = await tx.find(Membership, { accountId });
  const clubs = await tx.find(Club, { id: { $in: memberships.map(({ clubId }) => clubId) }, kind: 'my-log' });
  const [myLog] = clubs;
  if (!myLog) throw new Error('an account without a My log');
  return myLog.id;
}
