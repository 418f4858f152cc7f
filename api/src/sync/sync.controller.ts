import { Controller, HttpCode, Post } from '@nestjs/common';
import { ApiBearerAuth, ApiTags } from '@nestjs/swagger';
import { syncAnswerSchema, syncRequestSchema } from '@harkmoor/sync-model/protocol/message-schemas';
import type { SyncAnswer, SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { SignedIn, type SignedInAs } from '../platform/access/signed-in.js';
import { Answers } from '../platform/openapi/openapi-schema.js';
import { Taken, TakesBody } from '../platform/openapi/takes.js';
import { SyncRounds } from './sync-rounds.js';

/** The one endpoint through which phones send and receive the records of all their clubs. */
@ApiTags('sync')
@ApiBearerAuth()
@Controller('sync')
export class SyncController {
  constructor(private readonly rounds: SyncRounds) {}

  @Post()
  @HttpCode(200)
  @TakesBody(syncRequestSchema)
  @Answers(200, 'What became of each change, and what the phone does not hold yet', syncAnswerSchema)
  async round(@SignedIn() caller: SignedInAs, @Taken.body() request: SyncRequest): Promise<SyncAnswer> {
    return this.rounds.answer(caller.accountId, request);
  }
}
