import type { RoundLimits } from '../src/protocol/limits.js';
import { chooseAct, noveltyOf, type Novelty } from './acts.js';
import { emptyDisk, type CommitWatcher } from './disk.js';
import { GOOD_WEATHER, limitsFrom, skewFrom, weatherFrom, type Weather } from './faults.js';
import { checkConverged, checkCursors, checkNothingReferredDeleted, checkSave } from './invariants.js';
import { HubProcess } from './hub-process.js';
import { MemoryHub, type SaveWatcher } from './memory-hub.js';
import { createNetwork, type Network } from './network.js';
import { checkReadsOwnWrites, Oracle } from './oracle.js';
import type { PlantedFault } from './planted-faults.js';
import { changeMembership, PHONES, startClubs } from './people.js';
import { Phone } from './phone.js';
import { randomFrom, type Random } from './random.js';
import { noteRareAnswer, noteRareCommit, noteRareSave, type RareState } from './rare-states.js';
import { ROUNDS_TO_QUIET_MAX, STEPS_ACTIVE, STEPS_TO_REST_MAX, TURNS_MAX } from './run-limits.js';
import type { RunResult } from './run-result.js';
import { Scheduler, settled } from './scheduler.js';

/** Runs one fleet: three phones, a hub, a bad network, wrong clocks and crashes, all from one seed. */
export async function runFleet(seed: number, fault: PlantedFault | null = null): Promise<RunResult> {
  const fleet = new Fleet(seed, fault);
  await fleet.liveThroughFaults();
  await fleet.comeToRest();
  return fleet.result(seed);
}

class Fleet {
  private readonly random: Random;
  private readonly scheduler: Scheduler;
  private readonly oracle = new Oracle();
  private readonly novelty: Novelty = noveltyOf();
  private readonly reached = new Set<RareState>();
  private readonly hub: MemoryHub;
  private readonly network: Network;
  private readonly phones: Phone[];
  private weather: Weather;
  private readonly limits: RoundLimits;
  private simMs = Date.UTC(2026, 5, 1);
  private readonly server: HubProcess;

  constructor(
    seed: number,
    private readonly fault: PlantedFault | null,
  ) {
    this.random = randomFrom(seed);
    this.weather = weatherFrom(this.random);
    this.limits = limitsFrom(this.random);
    this.scheduler = new Scheduler(this.random);
    const onSave: SaveWatcher = (before, after) => {
      checkSave(this.oracle, before, after);
      noteRareSave(this.reached, before, after);
    };
    this.hub = new MemoryHub(this.scheduler, onSave, { name: 'hub', isDead: false });
    for (const club of startClubs()) this.hub.put(club);
    this.server = new HubProcess(this.hub, fault?.wrapHub?.(this.hub) ?? this.hub, this.scheduler, {
      nowMs: () => this.simMs,
      limits: this.limits,
      onAnswer: (answer) => noteRareAnswer(this.reached, answer),
      onError: (error) => this.report(error),
    });
    this.network = createNetwork(
      this.scheduler,
      this.random,
      () => this.weather.fates,
      (accountId, request) => this.server.answer(accountId, request),
    );
    this.phones = PHONES.map((phone, index) => this.startPhone(phone, index));
  }

  /** Acts, rounds and faults in any order, until enough has happened. */
  async liveThroughFaults(): Promise<void> {
    for (let turn = 0; turn < TURNS_MAX && this.scheduler.count < STEPS_ACTIVE; turn += 1) {
      this.simMs += this.random.below(20_000);
      this.strike();
      for (const phone of this.phones) this.use(phone);
      await settled();
      for (let i = this.random.below(12); i >= 0 && this.scheduler.waiting > 0; i -= 1) {
        await this.scheduler.runOne();
      }
    }
    if (this.scheduler.count < STEPS_ACTIVE) this.oracle.violate('I11', 'the fleet stands still');
  }

  /** I11: with faults over, each phone comes to rest by rounds alone, and all hold the same (I3). */
  async comeToRest(): Promise<void> {
    this.weather = { ...this.weather, fates: GOOD_WEATHER };
    this.network.deliverLate();
    await settled();
    await this.runAll();
    for (let round = 0; round < ROUNDS_TO_QUIET_MAX; round += 1) {
      const before = this.scheduler.traceHash;
      let isDone = true;
      for (const phone of this.phones) {
        phone.sync((error) => this.report(error));
        await settled();
        await this.runAll();
        const { lastOutcome: outcome } = phone;
        isDone &&= outcome?.kind === 'done' && !outcome.more;
      }
      this.scheduler.note(before);
      if (isDone && this.phones.every((phone) => this.isSettled(phone))) return this.checkRest(round);
    }
    const owed = this.phones.flatMap((phone) => phone.records().filter(({ debt }) => debt));
    this.oracle.violate(
      'I11',
      `not at rest after ${ROUNDS_TO_QUIET_MAX} rounds of each phone: ${JSON.stringify(owed)}`,
    );
  }

  result(seed: number): RunResult {
    const { violations } = this.oracle;
    const { traceHash, count: steps } = this.scheduler;
    for (const fate of this.network.fates.keys()) this.reached.add(`network: ${fate}`);
    if (this.hub.waits > 0) this.reached.add('a write waited for another');
    return { seed, violations, reached: this.reached, traceHash, steps };
  }

  private isSettled(phone: Phone): boolean {
    const clubs = [...phone.disk.state.clubs.values()];
    const isAtHead = clubs.every(({ clubId, cursor }) => cursor === this.hub.clubs.get(clubId)!.seq);
    return isAtHead && phone.isSettled();
  }

  private checkRest(rounds: number): void {
    this.scheduler.note(`quiet after ${rounds}`);
    for (const phone of this.phones) {
      this.oracle.checkNothingLost(phone.deviceId, phone.disk.state, this.hub);
      checkConverged(this.oracle, phone, this.hub);
    }
    checkNothingReferredDeleted(this.oracle, this.hub);
    for (const club of this.hub.clubs.values()) {
      this.scheduler.note(JSON.stringify([...club.records.values()]));
    }
  }

  private async runAll(): Promise<void> {
    while (this.scheduler.waiting > 0) {
      if (this.scheduler.count > STEPS_TO_REST_MAX) throw new Error('the fleet does not come to rest');
      await this.scheduler.runOne();
    }
  }

  private strike(): void {
    const { random, weather } = this;
    for (const phone of this.phones) {
      if (random.chance(weather.crashes)) {
        if (phone.isBusy) this.reached.add('crash in a round');
        if (phone.isActing) this.reached.add('crash in an act');
        phone.crash();
      }
      if (random.chance(weather.clockJumps)) phone.skewMs = skewFrom(random);
    }
    if (random.chance(weather.hubCrashes)) {
      this.reached.add('hub crashed');
      this.server.restart();
    }
    if (random.chance(weather.lateDeliveries) && this.network.deliverLate()) this.reached.add('late request');
    if (random.chance(weather.memberships)) this.scheduler.note(changeMembership(this.hub, random));
  }

  private use(phone: Phone): void {
    const { random } = this;
    const report = (error: unknown) => this.report(error);
    if (!phone.isBusy && random.chance(0.1)) phone.sync(report);
    if (!phone.isActing && random.chance(0.2)) {
      const act = chooseAct(phone, random, this.novelty);
      if (act) phone.act(act, report);
    }
  }

  private startPhone({ deviceId, accountId }: (typeof PHONES)[number], index: number): Phone {
    const onCommit: CommitWatcher = (before, after, writer) => {
      if (writer === 'person') return this.oracle.noteActs(deviceId, before, after);
      for (const clubId of before.clubs.keys()) {
        if (after.clubs.has(clubId)) continue;
        this.reached.add('left a club');
        this.oracle.noteLeft(deviceId, clubId, this.hub);
      }
      checkReadsOwnWrites(this.oracle, deviceId, before, after);
      this.oracle.checkNothingLost(deviceId, after, this.hub);
      checkCursors(this.oracle, deviceId, before, after, this.hub);
      noteRareCommit(this.reached, before, after);
    };
    const phone = new Phone(deviceId, accountId, emptyDisk(onCommit), {
      scheduler: this.scheduler,
      wallMs: () => this.simMs,
      limits: this.limits,
      linkOf: (account, life) => this.network.linkOf(account, life),
      wrapPorts: this.fault?.wrapPorts ?? ((ports) => ports),
    });
    phone.skewMs = this.weather.skewsMs[index]!;
    return phone;
  }

  private report(error: unknown): void {
    this.oracle.violate('error', error instanceof Error ? (error.stack ?? error.message) : String(error));
  }
}
