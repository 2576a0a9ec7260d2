import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module.js';
import { BreachRecorder } from './breach-recorder.js';
import { BreachesController } from './breaches.controller.js';
import { BreachesService } from './breaches.service.js';

@Module({
  imports: [MailModule],
  controllers: [BreachesController],
  providers: [BreachRecorder, BreachesService],
  exports: [BreachRecorder, BreachesService],
})
export class BreachesModule {}
