import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { PassportModule } from '@nestjs/passport';
import { StationsModule } from '../stations/stations.module.js';
import { ApiKeyStrategy } from './api-key.strategy.js';
import { ApiKeysController } from './api-keys.controller.js';
import { ApiKeysService } from './api-keys.service.js';
import { KeyThrottlerGuard } from './key-throttler.guard.js';

@Module({
  imports: [PassportModule, StationsModule],
  controllers: [ApiKeysController],
  // Guards of the root module would run before the access guard, whose key this one counts by.
  providers: [ApiKeysService, ApiKeyStrategy, { provide: APP_GUARD, useClass: KeyThrottlerGuard }],
  exports: [ApiKeysService],
})
export class ApiKeysModule {}
