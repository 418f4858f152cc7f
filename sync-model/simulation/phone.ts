import { CLOCK_OFFSET_SETTING } from '../src/device/clock-offset.js';
import { editedRecord, newRecord } from '../src/device/local-edit.js';
import type { DevicePorts, Link, RecordKey, StoreTransaction } from '../src/device/ports.js';
import type { StoredRecord } from '../src/device/stored-record.js';
import { createSyncEngine, type RoundOutcome, type SyncEngine } from '../src/device/sync-round.js';
import type { RoundLimits } from '../src/protocol/limits.js';
import type { WritableType } from '../src/records/record-types.js';
import type { FieldsByType } from '../src/records/schemas.js';
import { createStamper } from '../src/stamp/device-clock.js';
import { MemoryStores, type Disk } from './disk.js';
import type { Life, Scheduler } from './scheduler.js';

export type Stamper = ReturnType<typeof createStamper>;

/** What a person does in one transaction: reads and writes records with stamps of this phone. */
export type Act = (tx: StoreTransaction, write: ActWriter) => Promise<void>;

export type ActWriter = {
  make<T extends WritableType>(clubId: string, type: T, id: string, fields: FieldsByType[T]): StoredRecord;
  edit(record: StoredRecord, patch: Readonly<Record<string, unknown>>): StoredRecord;
};

/** Everything outside the phone that it touches; planted faults wrap these. */
export type PhoneWorld = {
  readonly scheduler: Scheduler;
  readonly wallMs: () => number;
  readonly limits: RoundLimits;
  readonly linkOf: (accountId: string, life: () => Life) => Link;
  readonly wrapPorts: (ports: DevicePorts) => DevicePorts;
};

/** One phone with the real engine in it. It may crash at any step and starts again from its disk. */
export class Phone {
  life: Life;
  isBusy = false;
  isActing = false;
  lastOutcome: RoundOutcome | null = null;
  crashes = 0;
  skewMs = 0;
  private engine!: SyncEngine;
  private stores!: MemoryStores;
  private stamper!: Stamper;
  private offsetMs = 0;

  constructor(
    readonly deviceId: string,
    readonly accountId: string,
    readonly disk: Disk,
    private readonly world: PhoneWorld,
  ) {
    this.life = { name: deviceId, isDead: false };
    this.start();
  }

  nowMs(): number {
    return Math.max(0, Math.floor(this.world.wallMs() + this.skewMs));
  }

  crash(): void {
    this.world.scheduler.kill(this.life);
    this.crashes += 1;
    this.life = { name: this.deviceId, isDead: false };
    this.isBusy = false;
    this.isActing = false;
    this.start();
  }

  /** Runs one round; `report` hears of a rejection, which no round should have. */
  sync(report: (error: unknown) => void): void {
    const { life } = this;
    this.isBusy = true;
    this.engine.runRound().then(
      (outcome) => {
        if (life !== this.life) return;
        this.lastOutcome = outcome;
        this.isBusy = false;
      },
      (error: unknown) => this.fail(life, error, report),
    );
  }

  act(act: Act, report: (error: unknown) => void): void {
    const { life } = this;
    this.isActing = true;
    this.stores
      .for('person')
      .transaction(async (tx) => {
        this.offsetMs = (await tx.setting<number>(CLOCK_OFFSET_SETTING)) ?? 0;
        await act(tx, this.actWriter());
      })
      .then(
        () => {
          if (life === this.life) this.isActing = false;
        },
        (error: unknown) => this.fail(life, error, report),
      );
  }

  private fail(life: Life, error: unknown, report: (error: unknown) => void): void {
    report(error);
    if (life !== this.life) return;
    this.isBusy = false;
    this.isActing = false;
  }

  records(): StoredRecord[] {
    return [...this.disk.state.records.values()];
  }

  /** Nothing is owed any more but what needs the person: refused, or waiting for something refused. */
  isSettled(): boolean {
    return this.records().every((record) => !record.debt || this.isForThePerson(record));
  }

  private isForThePerson({ debt }: StoredRecord): boolean {
    if (debt?.status !== 'held') return debt?.status === 'refused';
    return this.records().some((one) => one.id === debt.needs && this.isForThePerson(one));
  }

  private start(): void {
    const { world, life } = this;
    this.stores = new MemoryStores(this.disk, life, world.scheduler);
    this.stamper = createStamper({
      deviceId: this.deviceId,
      nowMs: () => this.nowMs() + this.offsetMs,
    });
    const ports: DevicePorts = {
      store: this.stores.for('engine'),
      link: world.linkOf(this.accountId, () => life),
      clock: { deviceNowMs: () => this.nowMs() },
      lock: { exclusively: (work) => work() },
    };
    this.engine = createSyncEngine(world.wrapPorts(ports), this, world.limits);
  }

  private actWriter(): ActWriter {
    const { accountId: ownerId, stamper } = this;
    return {
      make: (clubId, type, id, fields) =>
        newRecord({ clubId, type, id, ownerId, fields, deviceNowMs: this.nowMs() }, stamper) as StoredRecord,
      edit: (record, patch) =>
        editedRecord(record as StoredRecord<WritableType>, patch, this.nowMs(), stamper) as StoredRecord,
    };
  }
}

/** Reads one record again inside the act's transaction. */
export async function read(tx: StoreTransaction, key: RecordKey): Promise<StoredRecord | undefined> {
  return (await tx.records([key]))[0];
}
