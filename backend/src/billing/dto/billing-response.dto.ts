import { type Plan, PLANS, type Standing, STANDINGS } from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';
import type Stripe from 'stripe';
import { type Money, toMoney } from '../money.js';

const MOMENT = { type: String, format: 'date-time' } as const;

export class MoneyDto implements Money {
  @ApiProperty({ example: '19.00', description: 'Below zero = a credit.' })
  amount: string;

  @ApiProperty({ example: 'EUR' })
  currency: string;
}

export class NextInvoiceDto extends MoneyDto {
  @ApiProperty(MOMENT)
  at: string;
}

export class InvoiceDto extends MoneyDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ nullable: true, type: String })
  number: string | null;

  @ApiProperty(MOMENT)
  createdAt: string;

  @ApiProperty({ example: 'paid' })
  status: string;

  @ApiProperty({ nullable: true, type: String, description: 'Where the payment service shows it.' })
  url: string | null;
}

export class PaymentDto {
  @ApiProperty({ description: 'What a seat costs a month.' })
  seatPrice: MoneyDto;

  @ApiProperty({ type: NextInvoiceDto, nullable: true })
  next: NextInvoiceDto | null;

  @ApiProperty({ type: [InvoiceDto], description: 'The newest first.' })
  invoices: InvoiceDto[];
}

export class BillingResponseDto {
  @ApiProperty({ enum: PLANS })
  plan: Plan;

  @ApiProperty({ enum: STANDINGS })
  standing: Standing;

  @ApiProperty({ ...MOMENT, nullable: true, description: 'When the standing ends by itself.' })
  standingUntil: string | null;

  @ApiProperty({ type: 'integer', description: 'People that the plan allows.' })
  seats: number;

  @ApiProperty({ type: 'integer' })
  usedSeats: number;

  @ApiProperty({ description: 'Whether the team may start its one trial.' })
  mayTry: boolean;

  @ApiProperty({ description: 'Whether the plan was granted without payment.' })
  granted: boolean;

  @ApiProperty({ description: 'Whether the payment service knows the team.' })
  hasCustomer: boolean;

  @ApiProperty({ ...MOMENT, nullable: true, description: 'The end of the period that was invoiced last.' })
  periodEndsAt: string | null;

  @ApiProperty({
    ...MOMENT,
    nullable: true,
    description: 'When the subscription is set to end, or has ended.',
  })
  endsAt: string | null;

  @ApiProperty({
    type: PaymentDto,
    nullable: true,
    description: 'null = the payment service doesn’t answer.',
  })
  payment: PaymentDto | null;
}

/** Drafts aren't shown: they may still change. */
export function toInvoice(invoice: Stripe.Invoice): InvoiceDto[] {
  const { id, number, created, status, total, currency, hosted_invoice_url: url } = invoice;
  if (!status || status === 'draft') return [];
  const createdAt = new Date(created * 1000).toISOString();
  return [{ id, number, createdAt, status, url: url ?? null, ...toMoney(total, currency) }];
}
