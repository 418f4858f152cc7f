// @vitest-environment jsdom
import { Dexie } from 'dexie';
import { afterEach, describe, expect, it } from 'vitest';
import type { OpenLog } from '../../../store/open-log';
import { aReception, aSite, openTestAccountLog } from '../../../store/test-log';
import type { Overview } from '../answers/questions';
import { openEvidenceClient, type EvidenceClient } from './evidence-client';

const opened: { log: OpenLog; client: EvidenceClient }[] = [];

afterEach(async () => {
  for (const { log, client } of opened.splice(0)) {
    client.close();
    log.database.close();
  }
  for (const name of await Dexie.getDatabaseNames()) await Dexie.delete(name);
});

async function aClub() {
  const log = await openTestAccountLog();
  const client = openEvidenceClient({ databaseName: log.database.name, clubId: log.clubId, region: 1 });
  opened.push({ log, client });
  const site = await log.writer.create('site', aSite());
  const logOne = (deviceAt: number) =>
    log.writer.create('reception', {
      ...aReception(),
      siteId: site.id,
      basis: 'planned',
      deviceAt,
    });
  return { client, logOne };
}

const countOf = async (client: EvidenceClient) =>
  ((await client.ask({ kind: 'overview' })) as Overview).receptions;
const nextCount = (client: EvidenceClient) =>
  new Promise<void>((resolve) => {
    const stop = client.onCounted(() => {
      stop();
      resolve();
    });
  });
const HOUR_MS = 3_600_000;
const START = Date.UTC(2026, 10, 12, 19);

describe('the evidence on this device', () => {
  it('should count again after an entry while somebody looks', async () => {
    const { client, logOne } = await aClub();
    await logOne(START);
    expect(await countOf(client)).toBe(1);
    const counted = nextCount(client);
    await logOne(START + HOUR_MS);
    await counted;
    expect(await countOf(client)).toBe(2);
  });

  it('should count once when somebody looks again, and not before', async () => {
    const { client, logOne } = await aClub();
    expect(await countOf(client)).toBe(0);
    client.watch(false);
    await logOne(START);
    await new Promise((resolve) => setTimeout(resolve, 700));
    expect(await countOf(client)).toBe(0);
    const counted = nextCount(client);
    client.watch(true);
    await counted;
    expect(await countOf(client)).toBe(1);
  });
});
