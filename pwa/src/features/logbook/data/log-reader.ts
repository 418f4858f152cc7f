import { Dexie, type ObservabilitySet } from 'dexie';
import { HarkmoorDatabase } from '../../../store/database';
import { LogIndex } from '../index/log-index';
import type { LogNames } from '../index/log-names';
import { logRow } from '../index/log-row';
import type { LogAddress } from './desk-messages';
import { readAll, readIds, readNewest, readSome, type StoredReception } from './read-log';
import { NAME_TYPES, readNames } from './read-names';
import { writtenOf } from './written-ids';

/** Enough for the first screen of a laptop, and read in a few milliseconds. */
const FIRST_ROWS = 120;
/** Writes often come in runs: what they touched is read together. */
const SETTLE_MS = 60;
/** A first reading tells how far it is no oftener than this. */
const TELL_EVERY_MS = 250;

export type HeldLog = {
  readonly index: LogIndex;
  readonly names: LogNames;
  /** How many the log holds; more than the index while it is being read. */
  readonly heldCount: number;
  readonly isComplete: boolean;
};

type Pending = { all: boolean; names: boolean; readonly ids: Set<string> };
const nothing = (): Pending => ({ all: false, names: false, ids: new Set() });

/** Reads a log's rows newest first, then keeps them as they are written, here or in another tab. */
export class LogReader {
  private readonly database: HarkmoorDatabase;
  private readonly first: Promise<HeldLog>;
  private log: HeldLog | null = null;
  private pending = nothing();
  private isWatched = true;
  private isClosed = false;
  /** One reading at a time; what is written meanwhile is read after it. */
  private isBusy = true;
  private timer: ReturnType<typeof setTimeout> | undefined;

  /** `onChange` is called when what is held has become another. */
  constructor(
    private readonly address: LogAddress,
    private readonly onChange: () => void,
  ) {
    this.database = new HarkmoorDatabase(address.databaseName);
    Dexie.on.storagemutated.subscribe(this.note);
    this.first = this.readFirst();
    this.first.then(({ isComplete }) => this.work(isComplete ? null : this.readWhole), this.complain);
  }

  /** What is held now; waits only for the first rows. */
  async held(): Promise<HeldLog> {
    return this.log ?? this.first;
  }

  /** While nobody looks, a write is only noted: reading on would cost a phone in the field its battery. */
  watch(isWatched: boolean): void {
    this.isWatched = isWatched;
    this.settle();
  }

  close(): void {
    this.isClosed = true;
    clearTimeout(this.timer);
    Dexie.on.storagemutated.unsubscribe(this.note);
    this.database.close();
  }

  private async readFirst(): Promise<HeldLog> {
    const [names, newest] = await Promise.all([
      readNames(this.database, this.address),
      readNewest(this.database, this.address.clubId, FIRST_ROWS),
    ]);
    const index = new LogIndex();
    for (const row of newest) putOne(index, row.id, row);
    this.log = { index, names, heldCount: newest.length, isComplete: newest.length < FIRST_ROWS };
    return this.log;
  }

  /** All rows: into the index that is shown at the first reading, later beside it until it is whole. */
  private readonly readWhole = async (): Promise<void> => {
    const start = this.current();
    const isFirst = !start.isComplete;
    const index = isFirst ? start.index : new LogIndex();
    const { database } = this;
    const { clubId } = this.address;
    const ids = await readIds(database, clubId);
    if (isFirst) this.log = { ...start, heldCount: ids.length };
    let toldAt = Date.now();
    await readAll({ database, clubId }, ids, (rows) => {
      for (const row of rows) putOne(index, row.id, row);
      if (!isFirst || Date.now() - toldAt < TELL_EVERY_MS) return;
      toldAt = Date.now();
      this.onChange();
    });
    this.log = { ...this.current(), index, heldCount: index.size, isComplete: true };
  };

  private readonly catchUp = async (): Promise<void> => {
    const { all, names, ids } = this.pending;
    this.pending = nothing();
    if (names) this.log = { ...this.current(), names: await readNames(this.database, this.address) };
    if (all) return this.readWhole();
    const wanted = [...ids];
    const { index } = this.current();
    const rows = await readSome(this.database, this.address.clubId, wanted);
    rows.forEach((row, at) => putOne(index, wanted[at]!, row));
    this.log = { ...this.current(), heldCount: index.size };
  };

  private async work(read: (() => Promise<void>) | null): Promise<void> {
    this.isBusy = true;
    try {
      if (read) await read();
      this.isBusy = false;
      this.onChange();
      this.settle();
    } catch (error) {
      // what was noted is not lost with the reading that failed: the next write, or look, reads all
      this.isBusy = false;
      this.pending = { ...this.pending, all: true, names: true };
      this.complain(error);
    }
  }

  private settle(): void {
    clearTimeout(this.timer);
    if (this.isBusy || this.isClosed || !this.isWatched || !isPending(this.pending)) return;
    this.timer = setTimeout(() => void this.work(this.catchUp), SETTLE_MS);
  }

  private readonly note = (parts: ObservabilitySet): void => {
    const { databaseName, clubId } = this.address;
    if (NAME_TYPES.some((type) => parts[`idb://${databaseName}/${type}/`])) this.pending.names = true;
    const written = writtenOf(parts, { databaseName, clubId, type: 'reception' });
    if (written.kind === 'all') this.pending.all = true;
    if (written.kind === 'ids') for (const id of written.ids) this.pending.ids.add(id);
    this.settle();
  };

  private current(): HeldLog {
    if (!this.log) throw new Error('the first rows must be read before more are');
    return this.log;
  }

  private readonly complain = (error: unknown): void => {
    if (!this.isClosed) console.error('the log could not be read', error);
  };
}

function isPending({ all, names, ids }: Pending): boolean {
  return all || names || ids.size > 0;
}

function putOne(index: LogIndex, id: string, record: StoredReception | undefined): void {
  const row = record ? logRow(record) : null;
  if (row) index.put(row);
  else index.remove(id);
}
