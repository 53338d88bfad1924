import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { ScheduleModule } from '@nestjs/schedule';
import { ThrottlerModule } from '@nestjs/throttler';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { JwtAuthGuard } from './auth/jwt-auth.guard.js';
import { BillingModule } from './billing/billing.module.js';
import { ConditionsModule } from './conditions/conditions.module.js';
import { ConfigModule } from './config/config.module.js';
import { DatabaseModule } from './database/database.module.js';
import { HealthModule } from './health/health.module.js';
import { ImportsModule } from './imports/imports.module.js';
import { MailModule } from './mail/mail.module.js';
import { NoticesModule } from './notices/notices.module.js';
import { PartsModule } from './parts/parts.module.js';
import { PricesModule } from './prices/prices.module.js';
import { RankingModule } from './ranking/ranking.module.js';
import { AccessGuard } from './shared/access/access.guard.js';
import { CallerThrottlerGuard } from './shared/access/caller-throttler.guard.js';
import { RequestCounts } from './throttling/request-counts.service.js';
import { ThrottlingModule } from './throttling/throttling.module.js';

const REQUESTS_A_MINUTE = 600;

@Module({
  imports: [
    ConfigModule,
    DatabaseModule,
    ScheduleModule.forRoot(),
    ThrottlerModule.forRootAsync({
      imports: [ThrottlingModule],
      inject: [RequestCounts],
      useFactory: (storage: RequestCounts) => ({
        throttlers: [{ ttl: 60_000, limit: REQUESTS_A_MINUTE }],
        storage,
      }),
    }),
    AuditModule,
    AuthModule,
    BillingModule,
    ConditionsModule,
    HealthModule,
    ImportsModule,
    MailModule,
    NoticesModule,
    PartsModule,
    PricesModule,
    RankingModule,
  ],
  providers: [
    { provide: APP_GUARD, useClass: JwtAuthGuard },
    { provide: APP_GUARD, useClass: CallerThrottlerGuard },
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
})
export class AppModule {}
