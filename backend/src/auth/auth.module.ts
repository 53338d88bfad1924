import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { AppConfig } from '../config/app-config.js';
import { TeamsModule } from '../teams/teams.module.js';
import { UsersModule } from '../users/users.module.js';
import { AuthController } from './auth.controller.js';
import { AuthService } from './auth.service.js';
import { JwtStrategy } from './jwt.strategy.js';
import { SESSION_HOURS } from './session-cookie.js';
import { SessionTokenService } from './session-token.service.js';
import { SignInAttempts } from './sign-in-attempts.js';

@Module({
  imports: [
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
  controllers: [AuthController],
  providers: [AuthService, JwtStrategy, SessionTokenService, SignInAttempts],
  exports: [SessionTokenService],
})
export class AuthModule {}
