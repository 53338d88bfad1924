import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { AuditModule } from '../audit/audit.module.js';
import { AppConfig } from '../config/app-config.js';
import { MailModule } from '../mail/mail.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { TeamsModule } from '../teams/teams.module.js';
import { UsersModule } from '../users/users.module.js';
import { AccountController } from './account.controller.js';
import { AccountLinksController } from './account-links.controller.js';
import { AccountService } from './account.service.js';
import { AccountTokens } from './account-tokens.service.js';
import { Attempts } from './attempts.service.js';
import { AuthController } from './auth.controller.js';
import { AuthService } from './auth.service.js';
import { CloseAccount } from './close-account.service.js';
import { Confirmations } from './confirmations.service.js';
import { JwtStrategy } from './jwt.strategy.js';
import { OwnTeams } from './own-teams.service.js';
import { PasswordChanges } from './password-changes.service.js';
import { PasswordCheck } from './password-check.service.js';
import { PasswordReset } from './password-reset.service.js';
import { SESSION_HOURS } from './session-cookie.js';
import { SessionTokenService } from './session-token.service.js';
import { SessionsController } from './sessions.controller.js';
import { SessionsService } from './sessions.service.js';
import { SignUpService } from './sign-up.service.js';

@Module({
  imports: [
    AuditModule,
    MailModule,
    PlansModule,
    TeamsModule,
    UsersModule,
    JwtModule.registerAsync({
      inject: [AppConfig],
      useFactory: ({ JWT_SECRET }: AppConfig) => ({
        secret: JWT_SECRET,
        signOptions: { algorithm: 'HS256', expiresIn: `${SESSION_HOURS}h` },
      }),
    }),
  ],
  controllers: [AccountController, AccountLinksController, AuthController, SessionsController],
  providers: [
    AccountService,
    AccountTokens,
    Attempts,
    AuthService,
    CloseAccount,
    Confirmations,
    JwtStrategy,
    OwnTeams,
    PasswordChanges,
    PasswordCheck,
    PasswordReset,
    SessionsService,
    SessionTokenService,
    SignUpService,
  ],
  exports: [SessionsService],
})
export class AuthModule {}
