import type { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { Clock } from '../platform/clock/clock.js';
import { Club, type ItuRegion } from './club.entity.js';
import { Membership } from './membership.entity.js';

type Founder = { readonly id: string; readonly name: string };
type NewClub = { readonly kind: 'club' | 'my-log'; readonly name: string; readonly ituRegion: ItuRegion };

/** A club with its first member, who is its admin. */
export function foundClub(tx: EntityManager, founder: Founder, made: NewClub, nowMs: number): Club {
  const club = new Club({ id: newId(), ...made, demo: false, historyId: randomUUID(), nowMs });
  const seq = club.takeSeq();
  const { id: accountId, name } = founder;
  tx.persist(club);
  tx.persist(new Membership({ clubId: club.id, accountId, name, role: 'admin', seq, nowMs }));
  return club;
}

/** Each person's club of one, made with the account. */
@Injectable()
export class MyLog {
  constructor(private readonly clock: Clock) {}

  /** In the transaction that makes the account. */
  make(tx: EntityManager, founder: Founder): void {
    foundClub(tx, founder, { kind: 'my-log', name: 'My log', ituRegion: 1 }, this.clock.nowMs());
  }
}
