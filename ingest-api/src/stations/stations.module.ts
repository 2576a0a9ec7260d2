import { Module } from '@nestjs/common';
import { ProductsModule } from '../products/products.module.js';
import { CurrentPlansService } from './current-plans.service.js';
import { GoldenChecksService } from './golden-checks.service.js';
import { HeartbeatsController } from './heartbeats.controller.js';
import { HeartbeatsService } from './heartbeats.service.js';
import { StationActivityService } from './station-activity.service.js';
import { StationRegister } from './station-register.service.js';
import { StationsController } from './stations.controller.js';
import { TestPlansController } from './test-plans.controller.js';
import { StationsService } from './stations.service.js';

@Module({
  imports: [ProductsModule],
  controllers: [StationsController, TestPlansController, HeartbeatsController],
  providers: [
    StationRegister,
    StationActivityService,
    CurrentPlansService,
    GoldenChecksService,
    HeartbeatsService,
    StationsService,
  ],
  exports: [StationRegister, StationActivityService, GoldenChecksService],
})
export class StationsModule {}
