import { type DynamicModule, Module } from '@nestjs/common';
import { ScheduleModule } from '@nestjs/schedule';
import { ThrottlerModule } from '@nestjs/throttler';
import { LoggerModule } from 'nestjs-pino';
import { ApiKeysModule } from './api-keys/api-keys.module.js';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { BreachesModule } from './breaches/breaches.module.js';
import { type Clock, ConfigModule } from './config/config.module.js';
import type { Env } from './config/env.js';
import { loggerOptions } from './config/logger-options.js';
import { DatabaseModule } from './database/database.module.js';
import { IntakeModule } from './intake/intake.module.js';
import { LiveModule } from './live/live.module.js';
import { LocalMailboxModule } from './local-mailbox/local-mailbox.module.js';
import { MailModule } from './mail/mail.module.js';
import { ProductsModule } from './products/products.module.js';
import { ProofModule } from './proof/proof.module.js';
import { ResultsModule } from './results/results.module.js';
import { SiteSetupModule } from './site-setup/site-setup.module.js';
import { SiteModule } from './site/site.module.js';
import { StationsModule } from './stations/stations.module.js';
import { TodayModule } from './today/today.module.js';
import { UnitsModule } from './units/units.module.js';
import { UsersModule } from './users/users.module.js';
import { YieldModule } from './yield/yield.module.js';

@Module({})
export class AppModule {
  static for(env: Env, clock: Clock = Date.now): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.for(env, clock),
        LoggerModule.forRoot(loggerOptions(env)),
        ScheduleModule.forRoot(),
        ThrottlerModule.forRoot([{ ttl: 60_000, limit: env.postsPerMinutePerKey }]),
        DatabaseModule,
        LiveModule,
        AuditModule,
        AuthModule,
        UsersModule,
        ProductsModule,
        StationsModule,
        ApiKeysModule,
        MailModule,
        LocalMailboxModule,
        BreachesModule,
        IntakeModule,
        ResultsModule,
        UnitsModule,
        TodayModule,
        YieldModule,
        ProofModule,
        SiteModule,
        SiteSetupModule,
      ],
    };
  }
}
