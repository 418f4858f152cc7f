import 'reflect-metadata';
import { MikroORM } from '@mikro-orm/postgresql';
import { loadConfiguration } from './platform/configuration/configuration.js';
import { databaseOptions } from './mikro-orm.config.js';

/** Brings the database to this program's version; run before the server starts. */
const orm = await MikroORM.init(databaseOptions(loadConfiguration(process.env).databaseUrl));
try {
  await orm.migrator.up();
} finally {
  await orm.close();
}
