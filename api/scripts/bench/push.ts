import 'reflect-metadata';
import type { MikroORM } from '@mikro-orm/postgresql';
import { v7 } from 'uuid';
import { answerRound } from '@harkmoor/sync-model/hub/answer-round';
import { checkChange } from '@harkmoor/sync-model/hub/check-change';
import { syncRequestSchema } from '@harkmoor/sync-model/protocol/message-schemas';
import type { Change, SyncAnswer, SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { PROTOCOL_VERSION } from '@harkmoor/sync-model/protocol/version';
import { PostgresHubStore } from '../../src/sync/postgres-hub-store.js';
import { SyncFeatures } from '../../src/sync/sync-features.js';
import { withBenchDatabase } from './bench-database.js';
import { addPerson, withBenchServer, type BenchServer } from './bench-server.js';
import { lowerBoundMs } from './lower-bound.js';
import { parents, receptions } from './sample-receptions.js';
import { timedStore, type StoreTimes } from './timed-store.js';

const ENTRIES = 10_000;
const ENTRIES_PER_ROUND = 1000;
const RUNS = 5;

/** One line of the table: medians over the runs, and the worst of them. */
export type BenchRow = { readonly name: string; readonly medianMs: number; readonly worstMs: number };

type Parts = Record<string, number>;

/**
 * Measures a push of 10 000 receptions in 10 rounds to the whole server, its parts in the process, and the lower
 * bound, in turns. Makes and drops a database of its own on the server that `databaseUrl` names.
 */
export async function benchPush(databaseUrl: string): Promise<BenchRow[]> {
  return withBenchDatabase(databaseUrl, (orm, url) =>
    withBenchServer(url, async (server) => {
      const runs: Parts[] = [];
      for (let run = 0; run <= RUNS; run++) {
        const parts = await measureOnce(orm, server);
        if (run > 0) runs.push(parts); // the first warms everything up
      }
      return summary(runs);
    }),
  );
}

async function measureOnce(orm: MikroORM, server: BenchServer): Promise<Parts> {
  const forBound = receptions(ENTRIES, parents());
  const bound = await lowerBoundMs(orm, v7(), forBound);
  const push = await pushOverHttp(orm, server);
  const edits = await editsInProcess(orm, server);
  return {
    'lower bound: one gzip POST, one INSERT': bound,
    'push of 10 000 in 10 rounds': push,
    'times the bound': push / bound,
    ...(await partsInProcess(orm, server)),
    ...edits,
  };
}

async function pushOverHttp(orm: MikroORM, server: BenchServer): Promise<number> {
  const { accountId, clubId } = await addPerson(orm);
  const above = parents();
  await server.round(accountId, request(clubId, 0, above));
  const rounds = inRounds(receptions(ENTRIES, above));
  let cursor = 0;
  const started = performance.now();
  for (const changes of rounds) {
    const answer = await server.round(accountId, request(clubId, cursor, changes));
    cursor = mustBeApplied(answer, changes.length);
  }
  return performance.now() - started;
}

/** The same push without HTTP, with a clock at each step of the store. */
async function partsInProcess(orm: MikroORM, server: BenchServer): Promise<Parts> {
  const { accountId, clubId } = await addPerson(orm);
  const above = parents();
  await server.round(accountId, request(clubId, 0, above));
  const rounds = inRounds(receptions(ENTRIES, above)).map((changes) => request(clubId, 1, changes));
  const started = performance.now();
  for (const round of rounds) syncRequestSchema.parse(round);
  const border = performance.now() - started;
  const times = await runRounds(orm, server, accountId, rounds);
  const check = timeOf(() => rounds.forEach(({ clubs }) => clubs[0]!.changes!.forEach(checkChange)));
  const { total, read, write, lock, page, ends } = times;
  return {
    'part: border schema': border,
    'part: check': check,
    'part: merge': total - check - read - write - lock - page - ends,
    'part: read': read,
    'part: write': write,
    'part: locks': lock,
    'part: begin and commit': ends,
    'part: pull': page,
  };
}

/** 10 000 edits of stored receptions by a phone that had not seen the newest value: each makes a history row. */
async function editsInProcess(orm: MikroORM, server: BenchServer): Promise<Parts> {
  const { accountId, clubId } = await addPerson(orm);
  const above = parents();
  const made = receptions(ENTRIES, above);
  const editOf = ({ type, id, at }: Change): Change => ({
    type,
    id,
    at: `${(BigInt(`0x${at.slice(0, 16)}`) + 1n).toString(16).padStart(16, '0')}${at.slice(16)}`,
    fields: { remarks: 'Heard again on the recording.' },
    base: { remarks: at },
  });
  await server.round(accountId, request(clubId, 0, above));
  for (const changes of inRounds(made)) await server.round(accountId, request(clubId, 1, changes));
  const rounds = inRounds(made.map(editOf)).map((changes) => request(clubId, 1, changes));
  const times = await runRounds(orm, server, accountId, rounds);
  return { '10 000 edits, no HTTP': times.total, 'part: write and history of the edits': times.history };
}

async function runRounds(
  orm: MikroORM,
  server: BenchServer,
  accountId: string,
  rounds: readonly SyncRequest[],
): Promise<StoreTimes & { total: number }> {
  const times: StoreTimes = { read: 0, write: 0, history: 0, lock: 0, page: 0, ends: 0 };
  const store = new PostgresHubStore(orm.em.getKnex(), server.app.get(SyncFeatures));
  const ports = { store: timedStore(store, times), nowMs: () => Date.now(), newId: () => v7() };
  let cursor = rounds[0]!.clubs[0]!.cursor;
  const started = performance.now();
  for (const round of rounds) {
    const { changes = [], clubId } = round.clubs[0]!;
    const answer = await answerRound(
      ports,
      { accountId },
      { ...round, clubs: [{ clubId, historyId: null, cursor, changes }] },
    );
    cursor = mustBeApplied(answer, changes.length);
  }
  return { ...times, total: performance.now() - started };
}

function request(clubId: string, cursor: number, changes: Change[]): SyncRequest {
  const clubs = [{ clubId, historyId: null, cursor, changes }];
  return { protocol: PROTOCOL_VERSION, deviceId: 'benchone', sentAt: Date.now(), clubs };
}

function inRounds(changes: readonly Change[]): Change[][] {
  const rounds: Change[][] = [];
  for (let start = 0; start < changes.length; start += ENTRIES_PER_ROUND) {
    rounds.push(changes.slice(start, start + ENTRIES_PER_ROUND));
  }
  return rounds;
}

/** The cursor of the answer; throws where a change was not taken, since then nothing was measured. */
function mustBeApplied(answer: SyncAnswer, count: number): number {
  const [club] = answer.clubs;
  const applied = club?.results.filter(({ status }) => status === 'applied').length;
  if (!club || applied !== count) throw new Error(`only ${applied} of ${count} changes were applied`);
  return club.cursor;
}

function timeOf(work: () => void): number {
  const started = performance.now();
  work();
  return performance.now() - started;
}

function summary(runs: readonly Parts[]): BenchRow[] {
  return Object.keys(runs[0]!).map((name) => {
    const values = runs.map((parts) => parts[name]!).sort((a, b) => a - b);
    return { name, medianMs: values[Math.floor(values.length / 2)]!, worstMs: values.at(-1)! };
  });
}
