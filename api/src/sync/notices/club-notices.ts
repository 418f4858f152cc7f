import { MikroORM } from '@mikro-orm/postgresql';
import { Injectable, Logger } from '@nestjs/common';
import { Observable, type Subscriber } from 'rxjs';
import { inTransaction, type Query } from '../sql-session.js';
import { SyncFeatures } from '../sync-features.js';
import { ClubListener } from './club-listener.js';
import type { Notice } from './notice.js';

type Stream = {
  readonly accountId: string;
  /** The clubs of the account as far as this stream has told of them. */
  readonly clubIds: Set<string>;
  readonly subscriber: Subscriber<Notice>;
};

const BEGIN_READ = 'begin read only';

/** Tells open streams where the feeds of their people's clubs stand. Rights are looked up at each notice. */
@Injectable()
export class ClubNotices {
  private readonly log = new Logger(ClubNotices.name);
  private readonly streams = new Set<Stream>();
  /** Notices not told yet, the newest `seq` of each club alone. */
  private readonly waiting = new Map<string, number>();
  private isTelling = false;

  constructor(
    private readonly orm: MikroORM,
    private readonly features: SyncFeatures,
    private readonly listener: ClubListener,
  ) {}

  /**
   * First where each club of the account stands, then each later `seq`. Ends when a membership has ended and its
   * club has something new, or when notices may have been lost: whoever opens it again is told anew.
   */
  of(accountId: string): Observable<Notice> {
    return new Observable<Notice>((subscriber) => {
      const stream: Stream = { accountId, clubIds: new Set(), subscriber };
      this.streams.add(stream);
      this.start(stream).catch((error: unknown) => subscriber.error(error));
      return () => this.streams.delete(stream);
    });
  }

  private async start({ accountId, clubIds, subscriber }: Stream): Promise<void> {
    await this.listener.listen({
      onNotice: ({ clubId, seq }) => {
        this.waiting.set(clubId, Math.max(seq, this.waiting.get(clubId) ?? 0));
        void this.tellWaiting();
      },
      onLost: () => this.endAll(),
    });
    // after listening, so that nothing falls between
    const clubs = await this.read((query) => this.features.clubs().memberships(query, accountId));
    for (const { clubId, club } of clubs) {
      clubIds.add(clubId);
      subscriber.next({ clubId, seq: club.seq });
    }
  }

  private async tellWaiting(): Promise<void> {
    if (this.isTelling) return;
    this.isTelling = true;
    try {
      for (const [clubId, seq] of this.waiting) {
        this.waiting.delete(clubId);
        await this.tell({ clubId, seq });
      }
    } catch (error) {
      this.log.error(`a notice could not be told: ${error instanceof Error ? error.message : typeof error}`);
      this.waiting.clear();
      this.endAll();
    } finally {
      this.isTelling = false;
    }
  }

  private async tell(notice: Notice): Promise<void> {
    const streams = [...this.streams];
    if (streams.length === 0) return;
    const { clubId } = notice;
    const accountIds = [...new Set(streams.map(({ accountId }) => accountId))];
    const members = new Set(
      await this.read((query) => this.features.clubs().membersAmong(query, clubId, accountIds)),
    );
    for (const { accountId, clubIds, subscriber } of streams) {
      if (members.has(accountId)) {
        clubIds.add(clubId);
        subscriber.next(notice);
      } else if (clubIds.has(clubId)) subscriber.complete();
    }
  }

  private endAll(): void {
    for (const { subscriber } of this.streams) subscriber.complete();
  }

  private read<T>(work: (query: Query) => Promise<T>): Promise<T> {
    return inTransaction(this.orm.em.getKnex(), BEGIN_READ, work);
  }
}
