import { Controller, Get, Patch } from '@nestjs/common';
import { ApiBearerAuth, ApiTags } from '@nestjs/swagger';
import type { z } from 'zod';
import { SignedIn, type SignedInAs } from '../platform/access/signed-in.js';
import { granted } from '../platform/errors/refusal.js';
import { Answers } from '../platform/openapi/openapi-schema.js';
import { Taken, TakesBody, TakesParams } from '../platform/openapi/takes.js';
import { ClubAccess } from './club-access.js';
import { ClubPeople } from './club-people.js';
import {
  changeRoleSchema,
  clubParamsSchema,
  memberAnswerSchema,
  memberParamsSchema,
  membersAnswerSchema,
} from './club-schemas.js';
import type { Membership } from './membership.entity.js';

type MemberAnswer = z.infer<typeof memberAnswerSchema>;

@ApiTags('clubs')
@ApiBearerAuth()
@Controller('clubs/:clubId/members')
export class MembersController {
  constructor(
    private readonly access: ClubAccess,
    private readonly people: ClubPeople,
  ) {}

  @Get()
  @TakesParams(clubParamsSchema)
  @Answers(200, 'The current members', membersAnswerSchema)
  async members(
    @Taken.params() { clubId }: z.infer<typeof clubParamsSchema>,
    @SignedIn() me: SignedInAs,
  ): Promise<z.infer<typeof membersAnswerSchema>> {
    granted(await this.access.roleAtLeast(me.accountId, clubId, 'member'));
    return { members: (await this.people.members(clubId)).map(memberAnswer) };
  }

  @Patch(':accountId')
  @TakesParams(memberParamsSchema)
  @TakesBody(changeRoleSchema)
  @Answers(200, 'The member with the new role', memberAnswerSchema)
  async changeRole(
    @Taken.params() { clubId, accountId }: z.infer<typeof memberParamsSchema>,
    @Taken.body() { role }: z.infer<typeof changeRoleSchema>,
    @SignedIn() me: SignedInAs,
  ): Promise<MemberAnswer> {
    return memberAnswer(granted(await this.people.changeRole(me.accountId, clubId, accountId, role)));
  }
}

function memberAnswer({ accountId, name, role, joinedAt }: Membership): MemberAnswer {
  return { accountId, name, role, joinedAt };
}
