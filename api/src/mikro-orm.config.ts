import { Migrator } from '@mikro-orm/migrations';
import { defineConfig } from '@mikro-orm/postgresql';
import { Migration20261201100000 } from '../migrations/Migration20261201100000.js';
import { Migration20261201110000 } from '../migrations/Migration20261201110000.js';
import { Migration20261201120000 } from '../migrations/Migration20261201120000.js';
import { ACCOUNT_ENTITIES } from './accounts/account-entities.js';
import { CLUB_ENTITIES } from './clubs/club-entities.js';
import { LOGBOOK_ENTITIES } from './logbook/record-rows.js';
import { MAIL_ENTITIES } from './mail/mail-entities.js';
import { PLATFORM_ENTITIES } from './platform/platform-entities.js';
import { HistoryRow } from './sync/history.row.js';

/** Entities and migrations are named one by one: the same list holds in dist and in tests, with no look through folders. */
export function databaseOptions(databaseUrl: string, connectionsMax = 10) {
  return defineConfig({
    clientUrl: databaseUrl,
    entities: [
      ...PLATFORM_ENTITIES,
      ...ACCOUNT_ENTITIES,
      ...CLUB_ENTITIES,
      ...MAIL_ENTITIES,
      ...LOGBOOK_ENTITIES,
      HistoryRow,
    ],
    extensions: [Migrator],
    pool: { min: 0, max: connectionsMax },
    migrations: {
      migrationsList: [
        { name: 'Migration20261201100000', class: Migration20261201100000 },
        { name: 'Migration20261201110000', class: Migration20261201110000 },
        { name: 'Migration20261201120000', class: Migration20261201120000 },
      ],
      path: 'dist/migrations',
      pathTs: 'migrations',
      snapshot: false,
      silent: true,
    },
    logger: () => {},
  });
}

// for the command line of the mapper
export default databaseOptions(process.env.DATABASE_URL ?? 'postgresql://127.0.0.1/harkmoor');
