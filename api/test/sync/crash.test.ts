import { EVENING_MS, stampAt, TestHub } from './hub.js';
import { newRecord } from './sample-records.js';
import type { Change } from '@harkmoor/sync-model/protocol/messages';

let hub: TestHub;
beforeAll(async () => {
  hub = await TestHub.open();
});
afterAll(() => hub.close());

function antennas(count: number): Change[] {
  return Array.from({ length: count }, (_, n) =>
    newRecord('antenna', { name: `Wire ${n}`, kind: 'wire', sharedUse: false }, stampAt(EVENING_MS + n)),
  );
}

const countIn = async (clubId: string) => {
  const [row] = await hub.rows<{ count: string }>('select count(*) from antenna where club_id = ?', [clubId]);
  return Number(row!.count);
};

/** Ends the database connections that are writing to clubs, as a crash of the server's host would. */
async function endWriters(): Promise<void> {
  await hub.rows(
    `select pg_terminate_backend(pid) from pg_stat_activity
     where datname = current_database() and pid <> pg_backend_pid() and state <> 'idle'`,
  );
}

describe('a database connection that dies in the middle of a round', () => {
  it('should leave the chunk before whole, nothing of its own, and finish when the round is repeated', async () => {
    const clubId = await hub.addClub();
    const phone = await hub.newMember(clubId);
    const changes = antennas(700);
    // the third chunk of 250 runs into a row that this trigger makes it wait at
    await hub.rows(`create function stop_there() returns trigger language plpgsql as $$
      begin if new.name = 'Wire 600' then perform pg_sleep(30); end if; return new; end $$`);
    await hub.rows(
      'create trigger stop_there before insert on antenna for each row execute function stop_there()',
    );
    const round = phone.round(changes).then(
      () => 'answered',
      () => 'failed',
    );
    while ((await countIn(clubId)) < 500) await new Promise((resolve) => setTimeout(resolve, 5));
    await new Promise((resolve) => setTimeout(resolve, 100));
    await endWriters();
    expect(await round).toBe('failed');
    await hub.rows('drop trigger stop_there on antenna');

    expect(await countIn(clubId)).toBe(500);
    expect(await hub.seqOf(clubId)).toBe(501);
    const { results } = await phone.push(...changes);
    expect(results.every(({ status }) => status === 'applied')).toBe(true);
    expect(await countIn(clubId)).toBe(700);
    expect(await hub.seqOf(clubId)).toBe(701);
    const seqs = await hub.rows('select distinct seq from antenna where club_id = ?', [clubId]);
    expect(seqs).toHaveLength(700);
  });

  it('should serve the next rounds on new connections', async () => {
    const phone = await hub.newMember(await hub.addClub());
    await hub.rows(
      `select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and pid <> pg_backend_pid()`,
    );
    await new Promise((resolve) => setTimeout(resolve, 100));
    const { results } = await phone.push(...antennas(3));
    expect(results.map(({ status }) => status)).toEqual(['applied', 'applied', 'applied']);
  });
});

describe('a deadlock', () => {
  it('should be tried again instead of failing the round', async () => {
    const clubId = await hub.addClub();
    const phone = await hub.newMember(clubId);
    await hub.rows(`create sequence deadlock_tries`);
    await hub.rows(`create function dead_twice() returns trigger language plpgsql as $$
      begin if nextval('deadlock_tries') <= 2 then raise exception using errcode = '40P01'; end if; return new; end $$`);
    await hub.rows(
      'create trigger dead_twice before insert on antenna for each statement execute function dead_twice()',
    );
    const { results } = await phone.push(...antennas(2));
    await hub.rows('drop trigger dead_twice on antenna');
    expect(results.map(({ status }) => status)).toEqual(['applied', 'applied']);
    expect(await hub.seqOf(clubId)).toBe(3);
  });
});
