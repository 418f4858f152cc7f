import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import type { SignedInAs } from '../platform/access/signed-in.js';
import { Attempts } from '../platform/attempts/attempts.js';
import { Clock } from '../platform/clock/clock.js';
import { inTransaction } from '../platform/database/in-transaction.js';
import { Refusal } from '../platform/errors/refusal.js';
import { Secrets } from '../platform/secrets/secrets.js';
import { ClubAccess } from './club-access.js';
import { Club, type ItuRegion } from './club.entity.js';
import type { OwnClub } from './club-directory.js';
import { lockClub } from './club-people.js';
import { newJoinCode } from './join-code.js';
import { Membership } from './membership.entity.js';
import { foundClub } from './my-log.js';
import { confirmationRefusal, unknownCode } from './people-rules.js';

export type NewJoinCode = { readonly code: string; readonly expiresAt: number; readonly usesLeft: number };

/** At this rate, guessing one of 2⁵⁰ codes takes longer than anybody has. */
const TRIES_PER_HOUR = 20;

/** How clubs come to be and how people come into them. */
@Injectable()
export class ClubJoining {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
    private readonly access: ClubAccess,
    private readonly attempts: Attempts,
  ) {}

  /** The founder is the club's first admin. */
  async found(me: SignedInAs, name: string, ituRegion: ItuRegion): Promise<OwnClub | Refusal> {
    const refusal = confirmationRefusal(me.isConfirmed);
    if (refusal) return refusal;
    const founder = { id: me.accountId, name: me.name };
    const club = await inTransaction(this.em, (tx) =>
      foundClub(tx, founder, { kind: 'club', name, ituRegion }, this.clock.nowMs()),
    );
    return { clubId: club.id, role: 'admin', card: club.card() };
  }

  /** A code that opens the club as member, shown this once; it replaces the one before. */
  async makeCode(me: SignedInAs, clubId: string): Promise<NewJoinCode | Refusal> {
    const role = await this.access.roleAtLeast(me.accountId, clubId, 'admin');
    if (role instanceof Refusal) return role;
    const refusal = confirmationRefusal(me.isConfirmed);
    if (refusal) return refusal;
    const code = newJoinCode();
    return this.em.transactional(async (tx) => {
      const club = await lockClub(tx, clubId);
      if (club.kind === 'my-log') return new Refusal('forbidden', 'My log is never shared.');
      const expiresAt = club.openToCode(this.hashOf(code), this.clock.nowMs());
      return { code, expiresAt, usesLeft: club.joinCodeUsesLeft };
    });
  }

  /** Joins as member. Somebody who is in already stays what they are, and uses nothing up. */
  async join(me: SignedInAs, code: string): Promise<OwnClub | Refusal> {
    const refusal = await this.attempts.take(['join', me.accountId], {
      kind: 'window',
      free: TRIES_PER_HOUR,
    });
    if (refusal) return refusal;
    const codeHash = this.hashOf(code);
    return this.em.transactional(async (tx) => {
      const found = await tx.findOne(Club, { joinCodeHash: codeHash });
      if (!found) return unknownCode();
      const club = await lockClub(tx, found.id);
      const nowMs = this.clock.nowMs();
      if (!club.isOpenTo(codeHash, nowMs)) return unknownCode();
      const membership = await this.membershipAfter(tx, club, me, nowMs);
      return { clubId: club.id, role: membership.role, card: club.card() };
    });
  }

  private async membershipAfter(
    tx: EntityManager,
    club: Club,
    me: SignedInAs,
    nowMs: number,
  ): Promise<Membership> {
    const { accountId, name } = me;
    const earlier = await tx.findOne(Membership, { clubId: club.id, accountId }, { refresh: true });
    if (earlier?.isCurrent) return earlier;
    club.useJoinCode();
    const seq = club.takeSeq();
    if (earlier) {
      earlier.rejoin(seq, nowMs);
      return earlier;
    }
    const made = new Membership({ clubId: club.id, accountId, name, role: 'member', seq, nowMs });
    tx.persist(made);
    return made;
  }

  /** Keyed, so that a copy of the database opens no club. */
  private hashOf(code: string): string {
    return this.secrets.mac('join-code', code);
  }
}
