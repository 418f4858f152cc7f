import { ROLES, type Role } from '@harkmoor/sync-model/records/member';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { notFound, Refusal } from '../platform/errors/refusal.js';
import { Membership } from './membership.entity.js';

/** Each role may do all that the roles before it may do. */
export function hasRole(role: Role, atLeast: Role): boolean {
  return ROLES.indexOf(role) >= ROLES.indexOf(atLeast);
}

/** What an account may do in a club, asked anew at each request: no token carries a role. */
@Injectable()
export class ClubAccess {
  constructor(private readonly em: EntityManager) {}

  /** Null where there is no such club, or no current membership; nobody can tell which. */
  async roleOf(accountId: string, clubId: string): Promise<Role | null> {
    const membership = await this.em.findOne(Membership, { clubId, accountId, leftAt: null });
    return membership?.role ?? null;
  }

  /** The role, or why not: `not-found` for outsiders, `forbidden` for members whose role is too low. */
  async roleAtLeast(accountId: string, clubId: string, atLeast: Role): Promise<Role | Refusal> {
    const role = await this.roleOf(accountId, clubId);
    if (role === null) return notFound();
    if (!hasRole(role, atLeast)) return new Refusal('forbidden', `Only an ${atLeast} may do this.`);
    return role;
  }
}
