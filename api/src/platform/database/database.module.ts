import { MikroOrmModule } from '@mikro-orm/nestjs';
import { PostgreSqlDriver } from '@mikro-orm/postgresql';
import { databaseOptions } from '../../mikro-orm.config.js';
import { Configuration } from '../configuration/configuration.js';

/** The object mapper for the whole application; each request has an entity manager of its own. */
export const DatabaseModule = MikroOrmModule.forRootAsync({
  driver: PostgreSqlDriver,
  inject: [Configuration],
  useFactory: (configuration: Configuration) =>
    databaseOptions(configuration.databaseUrl, configuration.databaseConnections),
});
