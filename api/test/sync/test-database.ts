import { randomBytes } from 'node:crypto';
import { MikroORM } from '@mikro-orm/postgresql';
import { databaseOptions } from '../../src/mikro-orm.config.js';

/** A migrated database of this test file's own. */
export async function testDatabase(connectionsMax = 20): Promise<MikroORM> {
  const url = new URL(process.env.TEST_DATABASE_URL!);
  url.pathname = `/t_${process.pid}_${randomBytes(6).toString('hex')}`;
  const orm = await MikroORM.init(databaseOptions(url.href, connectionsMax));
  await orm.schema.ensureDatabase();
  await orm.migrator.up();
  return orm;
}
