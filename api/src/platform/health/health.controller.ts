import { MikroORM } from '@mikro-orm/postgresql';
import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { SkipThrottle } from '@nestjs/throttler';
import { z } from 'zod';
import { Public } from '../access/public.js';
import { granted, Refusal } from '../errors/refusal.js';
import { Answers } from '../openapi/openapi-schema.js';

const healthSchema = z.strictObject({ status: z.literal('ready') });

/** Ready means that the database answers and is at this program's version. */
@ApiTags('platform')
@SkipThrottle()
@Controller('health')
export class HealthController {
  private isMigrated = false;

  constructor(private readonly orm: MikroORM) {}

  @Public()
  @Get()
  @Answers(200, 'Ready to serve', healthSchema)
  async health(): Promise<z.infer<typeof healthSchema>> {
    granted(await this.unready());
    return { status: 'ready' };
  }

  private async unready(): Promise<Refusal | null> {
    try {
      await this.orm.em.getConnection().execute('select 1');
      // migrations only ever go forward while this process runs, so a yes holds
      this.isMigrated ||= (await this.orm.migrator.getPendingMigrations()).length === 0;
    } catch {
      return new Refusal('not-ready', 'The database does not answer.', undefined, 5);
    }
    return this.isMigrated
      ? null
      : new Refusal('not-ready', 'The database is not migrated yet.', undefined, 5);
  }
}
