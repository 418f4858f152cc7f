import type { ClubCard } from '@harkmoor/sync-model/protocol/messages';
import type { Role } from '@harkmoor/sync-model/records/member';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { Club } from './club.entity.js';
import { Membership } from './membership.entity.js';

export type OwnClub = { readonly clubId: string; readonly role: Role; readonly card: ClubCard };

/** Which clubs somebody is in. */
@Injectable()
export class ClubDirectory {
  constructor(private readonly em: EntityManager) {}

  /** My log first, then by name. */
  async clubsOf(accountId: string): Promise<OwnClub[]> {
    const memberships = await this.em.find(Membership, { accountId, leftAt: null });
    const clubs = await this.em.find(Club, { id: { $in: memberships.map(({ clubId }) => clubId) } });
    const clubOf = new Map(clubs.map((club) => [club.id, club]));
    return memberships
      .map(({ clubId, role }) => ({ clubId, role, card: clubOf.get(clubId)!.card() }))
      .sort((a, b) => orderOf(a).localeCompare(orderOf(b), 'en'));
  }

  /** For a caller whose role in the club was asked before. */
  async cardOf(clubId: string): Promise<ClubCard> {
    return (await this.em.findOneOrFail(Club, { id: clubId })).card();
  }
}

function orderOf({ clubId, card }: OwnClub): string {
  return `${card.kind === 'my-log' ? 0 : 1} ${card.name} ${clubId}`;
}
