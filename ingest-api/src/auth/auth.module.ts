import { Global, Module } from '@nestjs/common';
import { APP_GUARD, DiscoveryModule } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { SessionsService } from '../users/sessions.service.js';
import { AccessGuard } from './access.guard.js';
import { jwtSecret } from './jwt-secret.js';
import { RightsController } from './rights.controller.js';
import { RightsService } from './rights.service.js';
import { SessionCookie } from './session-cookie.js';
import { StationKeyGuard } from './station-key.guard.js';

/** Who is asking, and may they? One guard before every route, driven by the table of rights. */
@Global()
@Module({
  imports: [
    DiscoveryModule,
    JwtModule.registerAsync({
      inject: [ENV],
      // One algorithm, named on both sides: a token that names another (or none) is refused.
      useFactory: (env: Env) => ({
        secret: jwtSecret(env.dataDir),
        signOptions: { algorithm: 'HS256' },
        verifyOptions: { algorithms: ['HS256'] },
      }),
    }),
  ],
  controllers: [RightsController],
  providers: [
    RightsService,
    SessionsService,
    SessionCookie,
    StationKeyGuard,
    AccessGuard,
    { provide: APP_GUARD, useExisting: AccessGuard },
  ],
  exports: [SessionsService, SessionCookie],
})
export class AuthModule {}
