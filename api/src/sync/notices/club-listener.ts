import { MikroORM } from '@mikro-orm/postgresql';
import { Injectable, Logger, type BeforeApplicationShutdown } from '@nestjs/common';
import { parseNotice, type Notice } from './notice.js';

/** A connection outside the pool: it does nothing but listen, so no request ever waits for it. */
type ListeningConnection = {
  query(sql: string): Promise<unknown>;
  on(event: 'notification', listener: (message: { payload?: string }) => void): void;
  on(event: 'error' | 'end', listener: () => void): void;
  end(): Promise<void>;
};

type Listener = { onNotice(notice: Notice): void; onLost(): void };

/**
 * The process's one LISTEN connection, opened when the first stream asks for it. When it is lost, `onLost` says
 * that notices may be missing; the next `listen` opens another.
 */
@Injectable()
export class ClubListener implements BeforeApplicationShutdown {
  private readonly log = new Logger(ClubListener.name);
  private opening: Promise<ListeningConnection> | undefined;
  private isClosing = false;

  constructor(private readonly orm: MikroORM) {}

  /** Resolves once every later notice is going to be told. */
  async listen(listener: Listener): Promise<void> {
    this.opening ??= this.open(listener);
    await this.opening;
  }

  async beforeApplicationShutdown(): Promise<void> {
    this.isClosing = true;
    await this.opening?.then((connection) => connection.end()).catch(() => undefined);
  }

  private async open(listener: Listener): Promise<ListeningConnection> {
    const lost = () => {
      if (!this.opening) return;
      this.opening = undefined;
      if (!this.isClosing) this.log.warn('the connection that listens for notices was lost');
      listener.onLost();
    };
    try {
      const knex = this.orm.em.getKnex();
      const connection = (await knex.client.acquireRawConnection()) as ListeningConnection;
      connection.on('notification', ({ payload = '' }) => listener.onNotice(parseNotice(payload)));
      connection.on('error', lost);
      connection.on('end', lost);
      await connection.query('listen club_seq');
      return connection;
    } catch (error) {
      this.opening = undefined;
      throw error;
    }
  }
}
