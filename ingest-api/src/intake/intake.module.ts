import { Module } from '@nestjs/common';
import { StationsModule } from '../stations/stations.module.js';
import { IntakeController } from './intake.controller.js';
import { IntakeService } from './intake.service.js';
import { RefusedPostsService } from './refused-posts.service.js';

@Module({
  imports: [StationsModule],
  controllers: [IntakeController],
  providers: [IntakeService, RefusedPostsService],
  exports: [RefusedPostsService],
})
export class IntakeModule {}
