import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { ApiKeysModule } from '../api-keys/api-keys.module.js';
import { JobsModule } from '../jobs/jobs.module.js';
import { MailModule } from '../mail/mail.module.js';
import { PeopleModule } from '../people/people.module.js';
import { AccessGuard } from './access.guard.js';
import { AccessTokenStrategy } from './access-token.strategy.js';
import { AccessTokensService } from './access-tokens.service.js';
import { AccountLettersService } from './account-letters.service.js';
import { AccountTokensService } from './account-tokens.service.js';
import { AccountsResolver } from './accounts.resolver.js';
import { AccountsService } from './accounts.service.js';
import { AuthController } from './auth.controller.js';
import { FirstAdministratorService } from './first-administrator.service.js';
import { OwnAccountController } from './own-account.controller.js';
import { PasswordsService } from './passwords.service.js';
import { SessionAnswersService } from './session-answers.service.js';
import { SessionsService } from './sessions.service.js';
import { SignInService } from './sign-in.service.js';
import { SigningKeyModule } from './signing-key.module.js';
import { SIGNING_KEY } from './signing-key.js';
import { ThrottleService } from './throttle.service.js';
import { ALGORITHM, ISSUER } from './token-kinds.js';

const jwt = JwtModule.registerAsync({
  imports: [SigningKeyModule],
  inject: [SIGNING_KEY],
  useFactory: (secret: Buffer) => ({
    secret,
    signOptions: { issuer: ISSUER, algorithm: ALGORITHM },
    verifyOptions: { issuer: ISSUER, algorithms: [ALGORITHM] },
  }),
});

@Module({
  imports: [jwt, SigningKeyModule, PassportModule, JobsModule, MailModule, PeopleModule, ApiKeysModule],
  controllers: [AuthController, OwnAccountController],
  providers: [
    AccessTokenStrategy,
    AccessTokensService,
    AccountLettersService,
    AccountTokensService,
    AccountsResolver,
    AccountsService,
    FirstAdministratorService,
    PasswordsService,
    SessionAnswersService,
    SessionsService,
    SignInService,
    ThrottleService,
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [FirstAdministratorService, PasswordsService],
})
export class AuthModule {}
