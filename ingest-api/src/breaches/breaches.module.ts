import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module.js';
import { BreachRecorder } from './breach-recorder.js';

@Module({
  imports: [MailModule],
  providers: [BreachRecorder],
  exports: [BreachRecorder],
})
export class BreachesModule {}
