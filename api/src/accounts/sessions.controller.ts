import { Controller, HttpCode, Post, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import type { z } from 'zod';
import { Public } from '../platform/access/public.js';
import { Configuration } from '../platform/configuration/configuration.js';
import { granted, Refusal } from '../platform/errors/refusal.js';
import { networkOf } from '../platform/http/network-of.js';
import { Answers } from '../platform/openapi/openapi-schema.js';
import { Taken, TakesBody } from '../platform/openapi/takes.js';
import { nothingSchema, signedInSchema, signInSchema } from './account-schemas.js';
import { clearRefreshCookie, refreshTokenOf, setRefreshCookie } from './refresh-cookie.js';
import { Sessions, type OpenSession } from './sessions.js';
import { WhoAmIAnswer } from './who-am-i.js';

type SignedInAnswer = z.infer<typeof signedInSchema>;
type Nothing = z.infer<typeof nothingSchema>;

@ApiTags('accounts')
@Controller('accounts')
export class SessionsController {
  constructor(
    private readonly sessions: Sessions,
    private readonly whoAmI: WhoAmIAnswer,
    private readonly configuration: Configuration,
  ) {}

  @Public()
  @Post('sign-in')
  @HttpCode(200)
  @TakesBody(signInSchema)
  @Answers(200, 'Signed in; the refresh token is in a cookie', signedInSchema)
  async signIn(
    @Taken.body() body: z.infer<typeof signInSchema>,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedInAnswer> {
    const session = granted(await this.sessions.signIn(body, networkOf(request.ip ?? '')));
    return this.answer(session, response);
  }

  /** The old token works until the new one is first used, so a lost answer signs nobody out. */
  @Public()
  @Post('refresh')
  @HttpCode(200)
  @TakesBody(nothingSchema)
  @Answers(200, 'A new access token; the next refresh token is in the cookie', signedInSchema)
  async refresh(
    @Taken.body() _: Nothing,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedInAnswer> {
    const token = refreshTokenOf(request, this.configuration);
    const session = token
      ? await this.sessions.refresh(token)
      : new Refusal('unauthenticated', 'This device is not signed in.');
    if (session instanceof Refusal) clearRefreshCookie(response, this.configuration);
    return this.answer(granted(session), response);
  }

  @Public()
  @Post('sign-out')
  @HttpCode(204)
  @TakesBody(nothingSchema)
  @Answers(204, 'Signed out')
  async signOut(
    @Taken.body() _: Nothing,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    const token = refreshTokenOf(request, this.configuration);
    if (token) await this.sessions.signOut(token);
    clearRefreshCookie(response, this.configuration);
  }

  private async answer(session: OpenSession, response: Response): Promise<SignedInAnswer> {
    const { accountId, sessionId, refreshToken } = session;
    const { account, clubs } = await this.whoAmI.of(accountId);
    setRefreshCookie(response, refreshToken, this.configuration);
    return { accessToken: this.whoAmI.accessToken(accountId, sessionId), account, clubs };
  }
}
