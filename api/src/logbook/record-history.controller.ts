import { Controller, Get } from '@nestjs/common';
import { ApiBearerAuth, ApiTags } from '@nestjs/swagger';
import { ClubAccess } from '../clubs/club-access.js';
import { SignedIn, type SignedInAs } from '../platform/access/signed-in.js';
import { granted } from '../platform/errors/refusal.js';
import { Answers } from '../platform/openapi/openapi-schema.js';
import { Taken, TakesParams } from '../platform/openapi/takes.js';
import type { HistoryRow } from '../sync/history.row.js';
import { RecordHistory } from '../sync/record-history.js';
import {
  recordHistorySchema,
  recordPathSchema,
  type RecordHistoryAnswer,
  type RecordPath,
} from './record-history-schema.js';

/** What the fields of a record held before, for any member of its club. */
@ApiTags('logbook')
@ApiBearerAuth()
@Controller('clubs/:clubId/records/:type/:id/history')
export class RecordHistoryController {
  constructor(
    private readonly access: ClubAccess,
    private readonly history: RecordHistory,
  ) {}

  @Get()
  @TakesParams(recordPathSchema)
  @Answers(200, 'Replaced values, newest first', recordHistorySchema)
  async historyOf(
    @SignedIn() { accountId }: SignedInAs,
    @Taken.params() { clubId, type, id }: RecordPath,
  ): Promise<RecordHistoryAnswer> {
    granted(await this.access.roleAtLeast(accountId, clubId, 'member'));
    const rows = await this.history.of(clubId, type, id);
    return { rows: rows.map(answerRow) };
  }
}

function answerRow(row: HistoryRow): RecordHistoryAnswer['rows'][number] {
  const { id, field, byId, clash, at } = row;
  return {
    id,
    field,
    replaced: { value: row.replacedValue, stamp: row.replacedStamp },
    kept: { value: row.keptValue, stamp: row.keptStamp },
    byId,
    clash,
    at,
  };
}
