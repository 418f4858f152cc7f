import { Controller, Get, HttpCode, Post, Req } from '@nestjs/common';
import { ApiBearerAuth, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import type { z } from 'zod';
import { Public } from '../platform/access/public.js';
import { SignedIn, type SignedInAs } from '../platform/access/signed-in.js';
import { granted } from '../platform/errors/refusal.js';
import { networkOf } from '../platform/http/network-of.js';
import { Answers } from '../platform/openapi/openapi-schema.js';
import { Taken, TakesBody } from '../platform/openapi/takes.js';
import {
  acceptedSchema,
  confirmSchema,
  nothingSchema,
  resetRequestSchema,
  resetSchema,
  signUpSchema,
  whoAmISchema,
  type WhoAmI,
} from './account-schemas.js';
import { inLikeTime } from './like-time.js';
import { PasswordReset } from './password-reset.js';
import { SignUp } from './sign-up.js';
import { WhoAmIAnswer } from './who-am-i.js';

type Accepted = z.infer<typeof acceptedSchema>;
const ACCEPTED: Accepted = { status: 'accepted' };

@ApiTags('accounts')
@Controller('accounts')
export class AccountsController {
  constructor(
    private readonly accounts: SignUp,
    private readonly passwords: PasswordReset,
    private readonly whoAmI: WhoAmIAnswer,
  ) {}

  @Public()
  @Post('sign-up')
  @HttpCode(202)
  @TakesBody(signUpSchema)
  @Answers(202, 'A mail is on its way, whether the address is new or known', acceptedSchema)
  async signUp(@Taken.body() body: z.infer<typeof signUpSchema>, @Req() request: Request): Promise<Accepted> {
    granted(await inLikeTime(() => this.accounts.signUp(body, networkOf(request.ip ?? ''))));
    return ACCEPTED;
  }

  @Public()
  @Post('confirm')
  @HttpCode(200)
  @TakesBody(confirmSchema)
  @Answers(200, 'The address is confirmed', acceptedSchema)
  async confirm(@Taken.body() { token }: z.infer<typeof confirmSchema>): Promise<Accepted> {
    granted(await this.accounts.confirm(token));
    return ACCEPTED;
  }

  @ApiBearerAuth()
  @Post('confirm-again')
  @HttpCode(202)
  @TakesBody(nothingSchema)
  @Answers(202, 'The confirming mail is on its way again, if it is still needed', acceptedSchema)
  async confirmAgain(
    @Taken.body() _: z.infer<typeof nothingSchema>,
    @SignedIn() me: SignedInAs,
    @Req() request: Request,
  ): Promise<Accepted> {
    granted(await this.accounts.confirmAgain(me.accountId, networkOf(request.ip ?? '')));
    return ACCEPTED;
  }

  @Public()
  @Post('reset-request')
  @HttpCode(202)
  @TakesBody(resetRequestSchema)
  @Answers(202, 'If the address is known, a mail is on its way', acceptedSchema)
  async requestReset(
    @Taken.body() { email }: z.infer<typeof resetRequestSchema>,
    @Req() request: Request,
  ): Promise<Accepted> {
    granted(await inLikeTime(() => this.passwords.request(email, networkOf(request.ip ?? ''))));
    return ACCEPTED;
  }

  @Public()
  @Post('reset')
  @HttpCode(200)
  @TakesBody(resetSchema)
  @Answers(200, 'The password is set and every device is signed out', acceptedSchema)
  async reset(@Taken.body() { token, password }: z.infer<typeof resetSchema>): Promise<Accepted> {
    granted(await this.passwords.reset(token, password));
    return ACCEPTED;
  }

  @ApiBearerAuth()
  @Get('me')
  @Answers(200, 'The signed-in account and its clubs', whoAmISchema)
  me(@SignedIn() me: SignedInAs): Promise<WhoAmI> {
    return this.whoAmI.of(me.accountId);
  }
}
