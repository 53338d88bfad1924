import { Module } from '@nestjs/common';
import { MailController } from './mail.controller.js';
import { MailPreferences } from './mail-preferences.service.js';
import { MailQueue } from './mail-queue.service.js';
import { MailSender } from './mail-sender.service.js';
import { UnsubscribeLinks } from './unsubscribe-links.service.js';

@Module({
  controllers: [MailController],
  providers: [MailPreferences, MailQueue, MailSender, UnsubscribeLinks],
  exports: [MailQueue],
})
export class MailModule {}
