import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { ClubsModule } from '../clubs/clubs.module.js';
import { MailModule } from '../mail/mail.module.js';
import { Secrets } from '../platform/secrets/secrets.js';
import { AccessGuard } from './access.guard.js';
import { ACCESS_ALGORITHM, ACCESS_AUDIENCE, ACCESS_ISSUER, ACCESS_TYPE } from './access-token.js';
import { AccessTokenStrategy } from './access-token.strategy.js';
import { AccountsController } from './accounts.controller.js';
import { MailAllowance } from './mail-allowance.js';
import { MailLinks } from './mail-links.js';
import { OldRows } from './old-rows.js';
import { PasswordReset } from './password-reset.js';
import { Sessions } from './sessions.js';
import { SessionsController } from './sessions.controller.js';
import { SignUp } from './sign-up.js';
import { WhoAmIAnswer } from './who-am-i.js';

/** Who somebody is: accounts, devices, tokens. Its guard stands before every route of the application. */
@Module({
  imports: [
    PassportModule,
    ClubsModule,
    MailModule,
    JwtModule.registerAsync({
      inject: [Secrets],
      useFactory: (secrets: Secrets) => ({
        secret: secrets.key('access-token'),
        signOptions: {
          algorithm: ACCESS_ALGORITHM,
          audience: ACCESS_AUDIENCE,
          issuer: ACCESS_ISSUER,
          header: { alg: ACCESS_ALGORITHM, typ: ACCESS_TYPE },
        },
      }),
    }),
  ],
  controllers: [AccountsController, SessionsController],
  providers: [
    AccessTokenStrategy,
    { provide: APP_GUARD, useClass: AccessGuard },
    MailAllowance,
    MailLinks,
    OldRows,
    PasswordReset,
    Sessions,
    SignUp,
    WhoAmIAnswer,
  ],
})
export class AccountsModule {}
