import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { MailModule } from '../mail/mail.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { TeamsModule } from '../teams/teams.module.js';
import { BillingEvents } from './billing-events.service.js';
import { BillingSync } from './billing-sync.service.js';
import { BillingWebhookController } from './billing-webhook.controller.js';
import { BillingController } from './billing.controller.js';
import { BillingService } from './billing.service.js';
import { Checkouts } from './checkouts.service.js';
import { FailedPaymentMail } from './failed-payment-mail.service.js';
import { Payments } from './payments.js';
import { SeatChanges } from './seat-changes.service.js';
import { Trials } from './trials.service.js';

@Module({
  imports: [AuditModule, MailModule, PlansModule, TeamsModule],
  controllers: [BillingController, BillingWebhookController],
  providers: [
    BillingEvents,
    BillingService,
    BillingSync,
    Checkouts,
    FailedPaymentMail,
    Payments,
    SeatChanges,
    Trials,
  ],
})
export class BillingModule {}
