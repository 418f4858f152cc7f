import { LockMode } from '@mikro-orm/core';
import type { Role } from '@harkmoor/sync-model/records/member';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { Clock } from '../platform/clock/clock.js';
import { notFound, Refusal } from '../platform/errors/refusal.js';
import { hasRole } from './club-access.js';
import { Club } from './club.entity.js';
import { Membership } from './membership.entity.js';
import { lastAdminRefusal } from './people-rules.js';

const lockMode = LockMode.PESSIMISTIC_WRITE;

/** Locks a club's row: whoever raises `seq` holds it until the end of the transaction. */
export function lockClub(tx: EntityManager, clubId: string): Promise<Club> {
  return tx.findOneOrFail(Club, { id: clubId }, { lockMode, refresh: true });
}

/** The people of a club and their roles. */
@Injectable()
export class ClubPeople {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  /** Current members by name. */
  members(clubId: string): Promise<Membership[]> {
    return this.em.find(Membership, { clubId, leftAt: null }, { orderBy: { name: 'asc', accountId: 'asc' } });
  }

  /**
   * Gives a member another role. Memberships are locked before the club, and in the order of their ids: a sync
   * round locks its own membership and then the club, and the other way round they would wait for each other.
   */
  changeRole(byId: string, clubId: string, accountId: string, role: Role): Promise<Membership | Refusal> {
    return this.em.transactional(async (tx) => {
      const both = await tx.find(
        Membership,
        { clubId, accountId: { $in: [byId, accountId] } },
        { lockMode, orderBy: { accountId: 'asc' }, refresh: true },
      );
      const by = both.find((membership) => membership.accountId === byId && membership.isCurrent);
      if (!by) return notFound();
      if (!hasRole(by.role, 'admin')) return new Refusal('forbidden', 'Only an admin may change roles.');
      const target = both.find((membership) => membership.accountId === accountId && membership.isCurrent);
      if (!target) return notFound();
      const club = await lockClub(tx, clubId);
      const adminCount = await tx.count(Membership, { clubId, role: 'admin', leftAt: null });
      const refusal = lastAdminRefusal(target.role, role, adminCount);
      if (refusal) return refusal;
      if (target.role !== role) target.changeRole(role, club.takeSeq(), this.clock.nowMs());
      return target;
    });
  }
}
