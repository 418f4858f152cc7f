import { editedRecord, newRecord } from '../src/device/local-edit.js';
import type { DevicePorts, LinkAnswer } from '../src/device/ports.js';
import type { StoredRecord } from '../src/device/stored-record.js';
import { CLOCK_OFFSET_SETTING } from '../src/device/clock-offset.js';
import { createSyncEngine, type SyncEngine } from '../src/device/sync-round.js';
import { answerRound } from '../src/hub/answer-round.js';
import { asSyncAnswer } from '../src/protocol/light-check.js';
import type { RoundLimits } from '../src/protocol/limits.js';
import type { SyncAnswer, SyncRequest } from '../src/protocol/messages.js';
import type { WritableType } from '../src/records/record-types.js';
import type { FieldsByType } from '../src/records/schemas.js';
import { createStamper } from '../src/stamp/device-clock.js';
import { emptyDisk, keyOf, MemoryStores, type Disk } from './disk.js';
import { MemoryHub } from './memory-hub.js';
import { CLUB, idOf, startClubs } from './people.js';
import { SAMPLES } from './sample-fields.js';
import { NO_WAITING } from './scheduler.js';

/** A hub and phones on a good network where nothing waits: for tests of one situation at a time. */
export class QuietWorld {
  nowMs = Date.UTC(2026, 5, 1);
  readonly requests: SyncRequest[] = [];
  readonly hub = new MemoryHub(NO_WAITING, () => {}, { name: 'hub', isDead: false });
  private made = 0x7000_0000;

  constructor(readonly limits?: RoundLimits) {
    for (const club of startClubs()) this.hub.put(club);
  }

  id(): string {
    return idOf((this.made += 1));
  }

  ask(accountId: string, request: SyncRequest): Promise<SyncAnswer> {
    const ports = { store: this.hub, nowMs: () => this.nowMs, newId: () => this.id() };
    this.requests.push(request);
    return answerRound(ports, { accountId }, structuredClone(request), this.limits);
  }

  phone(deviceId: string, accountId: string, skewMs = 0): QuietPhone {
    return new QuietPhone(this, deviceId, accountId, skewMs);
  }
}

export class QuietPhone {
  readonly disk: Disk = emptyDisk(() => {});
  readonly engine: SyncEngine;
  /** Runs while the hub works on a round of this phone. */
  meanwhile: (() => Promise<void>) | null = null;
  /** What the link says in place of asking the hub. */
  linkSays: LinkAnswer | null = null;
  private readonly stores = new MemoryStores(this.disk, { name: 'phone', isDead: false }, NO_WAITING);
  private readonly stamper: ReturnType<typeof createStamper>;

  constructor(
    private readonly world: QuietWorld,
    readonly deviceId: string,
    readonly accountId: string,
    public skewMs: number,
  ) {
    const offsetMs = () => (this.disk.state.settings.get(CLOCK_OFFSET_SETTING) as number | undefined) ?? 0;
    this.stamper = createStamper({ deviceId, nowMs: () => this.nowMs() + offsetMs() });
    const ports: DevicePorts = {
      store: this.stores.for('engine'),
      link: { exchange: (request) => this.exchange(request) },
      clock: { deviceNowMs: () => this.nowMs() },
      lock: { exclusively: (work) => work() },
    };
    this.engine = createSyncEngine(ports, this, world.limits);
  }

  nowMs(): number {
    return this.world.nowMs + this.skewMs;
  }

  async make<T extends WritableType>(
    clubId: string,
    type: T,
    fields: FieldsByType[T],
    id = this.world.id(),
  ): Promise<string> {
    const made = { clubId, type, id, ownerId: this.accountId, fields, deviceNowMs: this.nowMs() };
    await this.put(newRecord(made, this.stamper) as StoredRecord);
    return id;
  }

  async edit(clubId: string, type: WritableType, id: string, patch: Record<string, unknown>): Promise<void> {
    const record = this.record(clubId, type, id) as StoredRecord<WritableType>;
    await this.put(editedRecord(record, patch, this.nowMs(), this.stamper) as StoredRecord);
  }

  put(record: StoredRecord): Promise<void> {
    return this.stores.for('person').transaction((tx) => tx.putRecords([record]));
  }

  record(clubId: string, type: StoredRecord['type'], id: string): StoredRecord {
    const record = this.disk.state.records.get(keyOf({ clubId, type, id }));
    if (!record) throw new Error(`the phone holds no ${type} ${id}`);
    return record;
  }

  records(type: StoredRecord['type']): StoredRecord[] {
    return [...this.disk.state.records.values()].filter((record) => record.type === type);
  }

  /** Rounds until nothing is left to do; answers how many it took. */
  async syncAll(): Promise<number> {
    for (let rounds = 1; rounds <= 100; rounds += 1) {
      const outcome = await this.engine.runRound();
      if (outcome.kind === 'paused') throw new Error(`paused: ${outcome.reason}`);
      if (!outcome.more) return rounds;
    }
    throw new Error('the phone never comes to rest');
  }

  private async exchange(request: SyncRequest): Promise<LinkAnswer> {
    if (this.linkSays) return this.linkSays;
    const answer = await this.world.ask(this.accountId, request);
    await this.meanwhile?.();
    const body = asSyncAnswer(structuredClone(answer));
    return body ? { kind: 'answer', body } : { kind: 'unreachable' };
  }
}

/** A reception with all that it refers to, made on a phone in the club; answers its id. */
export async function makeReception(on: QuietPhone): Promise<string> {
  const site = await on.make(CLUB, 'site', SAMPLES.site('Ravnklit'));
  const receiver = await on.make(CLUB, 'receiver', SAMPLES.receiver('bag receiver'));
  const antenna = await on.make(CLUB, 'antenna', SAMPLES.antenna('long wire'));
  const setup = await on.make(CLUB, 'setup', SAMPLES.setup(receiver, antenna));
  return on.make(CLUB, 'reception', SAMPLES.reception(site, setup));
}
