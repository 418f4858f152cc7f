import { Module } from '@nestjs/common';
import { MailQueue } from './mail-queue.js';
import { MailSender } from './mail-sender.js';

@Module({
  providers: [MailQueue, MailSender],
  exports: [MailQueue],
})
export class MailModule {}
