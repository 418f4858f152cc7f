import { MikroORM } from '@mikro-orm/postgresql';
import { databaseOptions } from '../../src/mikro-orm.config.js';

/** A migrated database beside the given one, dropped after `work`. */
export async function withBenchDatabase<T>(
  databaseUrl: string,
  work: (orm: MikroORM, url: string) => Promise<T>,
): Promise<T> {
  const url = new URL(databaseUrl);
  url.pathname = `/bench_${Date.now().toString(36)}`;
  const orm = await MikroORM.init(databaseOptions(url.href));
  await orm.schema.ensureDatabase();
  try {
    await orm.migrator.up();
    return await work(orm, url.href);
  } finally {
    await orm.schema.dropDatabase();
    await orm.close(true);
  }
}
