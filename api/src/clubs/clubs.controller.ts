import { Controller, Get, HttpCode, Post } from '@nestjs/common';
import { ApiBearerAuth, ApiTags } from '@nestjs/swagger';
import type { z } from 'zod';
import { SignedIn, type SignedInAs } from '../platform/access/signed-in.js';
import { granted } from '../platform/errors/refusal.js';
import { Answers } from '../platform/openapi/openapi-schema.js';
import { Taken, TakesBody, TakesParams } from '../platform/openapi/takes.js';
import { ClubAccess } from './club-access.js';
import { ClubDirectory, type OwnClub } from './club-directory.js';
import { ClubJoining, type NewJoinCode } from './club-joining.js';
import {
  clubAnswerSchema,
  clubParamsSchema,
  foundSchema,
  joinCodeAnswerSchema,
  joinSchema,
  newCodeSchema,
} from './club-schemas.js';

type ClubAnswer = z.infer<typeof clubAnswerSchema>;
type ClubParams = z.infer<typeof clubParamsSchema>;

@ApiTags('clubs')
@ApiBearerAuth()
@Controller('clubs')
export class ClubsController {
  constructor(
    private readonly access: ClubAccess,
    private readonly directory: ClubDirectory,
    private readonly joining: ClubJoining,
  ) {}

  @Post()
  @HttpCode(201)
  @TakesBody(foundSchema)
  @Answers(201, 'The club was founded; you are its admin', clubAnswerSchema)
  async found(
    @Taken.body() body: z.infer<typeof foundSchema>,
    @SignedIn() me: SignedInAs,
  ): Promise<ClubAnswer> {
    return clubAnswer(granted(await this.joining.found(me, body.name, body.ituRegion)));
  }

  @Post('join')
  @HttpCode(200)
  @TakesBody(joinSchema)
  @Answers(200, 'You are in the club', clubAnswerSchema)
  async join(
    @Taken.body() body: z.infer<typeof joinSchema>,
    @SignedIn() me: SignedInAs,
  ): Promise<ClubAnswer> {
    return clubAnswer(granted(await this.joining.join(me, body.code)));
  }

  @Get(':clubId')
  @TakesParams(clubParamsSchema)
  @Answers(200, 'The club and your role in it', clubAnswerSchema)
  async club(@Taken.params() { clubId }: ClubParams, @SignedIn() me: SignedInAs): Promise<ClubAnswer> {
    const role = granted(await this.access.roleAtLeast(me.accountId, clubId, 'member'));
    return clubAnswer({ clubId, role, card: await this.directory.cardOf(clubId) });
  }

  @Post(':clubId/join-code')
  @HttpCode(201)
  @TakesParams(clubParamsSchema)
  @TakesBody(newCodeSchema)
  @Answers(201, 'A code for joining, told this once', joinCodeAnswerSchema)
  async makeCode(
    @Taken.params() { clubId }: ClubParams,
    @Taken.body() _: z.infer<typeof newCodeSchema>,
    @SignedIn() me: SignedInAs,
  ): Promise<NewJoinCode> {
    const { code, expiresAt, usesLeft } = granted(await this.joining.makeCode(me, clubId));
    return { code, expiresAt, usesLeft };
  }
}

function clubAnswer({ clubId, role, card: { name, kind, ituRegion, demo } }: OwnClub): ClubAnswer {
  return { clubId, role, card: { name, kind, ituRegion, demo } };
}
