import { Module } from '@nestjs/common';
import { PassportModule } from '@nestjs/passport';
import { StationsModule } from '../stations/stations.module.js';
import { ApiKeyStrategy } from './api-key.strategy.js';
import { ApiKeysController } from './api-keys.controller.js';
import { ApiKeysService } from './api-keys.service.js';

@Module({
  imports: [PassportModule, StationsModule],
  controllers: [ApiKeysController],
  providers: [ApiKeysService, ApiKeyStrategy],
  exports: [ApiKeysService],
})
export class ApiKeysModule {}
