import { planState } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { PlansService } from '../plans/plans.service.js';
import type { Subscription } from '../plans/entities/subscription.entity.js';
import type { Caller } from '../shared/access/caller.js';
import { SeatsService } from '../teams/seats.service.js';
import { type BillingResponseDto, type PaymentDto, toInvoice } from './dto/billing-response.dto.js';
import { toMoney } from './money.js';
import { Payments } from './payments.js';
import { mayTry } from './trials.service.js';

const MOST_INVOICES = 24;

@Injectable()
export class BillingService {
  constructor(
    private readonly payments: Payments,
    private readonly plans: PlansService,
    private readonly seats: SeatsService,
  ) {}

  /** The team's plan as it is kept, and as far as the payment service answers what it costs. */
  async find({ teamId }: Caller): Promise<BillingResponseDto> {
    const [kept, { used }] = await Promise.all([this.plans.find(teamId), this.seats.count(teamId)]);
    const { plan, standing, seats, until } = planState(kept, new Date());
    return {
      plan,
      standing,
      standingUntil: until?.toISOString() ?? null,
      seats,
      usedSeats: used,
      mayTry: mayTry(kept),
      granted: kept?.status === 'active' && kept.subscriptionId === null,
      hasCustomer: Boolean(kept?.customerId),
      periodEndsAt: kept?.currentPeriodEnd?.toISOString() ?? null,
      endsAt: kept?.endsAt?.toISOString() ?? null,
      payment: await this.payment(kept).catch(() => null),
    };
  }

  private async payment(kept: Subscription | null): Promise<PaymentDto> {
    const [price, next, invoices] = await Promise.all([
      this.payments.price(),
      this.next(kept),
      this.invoices(kept?.customerId),
    ]);
    return { seatPrice: toMoney(price.unit_amount ?? 0, price.currency), next, invoices };
  }

  private async next(kept: Subscription | null): Promise<PaymentDto['next']> {
    if (!kept?.subscriptionId || kept.status !== 'active' || kept.endsAt !== null) return null;
    const { subscriptionId: subscription } = kept;
    const invoice = await this.payments.ask((service) => service.invoices.createPreview({ subscription }));
    const starts = invoice.lines.data.map(({ period }) => period.start);
    const at = new Date(Math.max(...starts) * 1000).toISOString();
    return { ...toMoney(invoice.amount_due, invoice.currency), at };
  }

  private async invoices(customer: string | null | undefined): Promise<PaymentDto['invoices']> {
    if (!customer) return [];
    const { data } = await this.payments.ask((service) =>
      service.invoices.list({ customer, limit: MOST_INVOICES }),
    );
    return data.flatMap(toInvoice);
  }
}
