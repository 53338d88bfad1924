/** The objects of the service, with the fields that the application and its tests ask for. */
export interface Customer {
  id: string;
  object: 'customer';
  created: number;
  livemode: false;
  name: string | null;
  email: string | null;
  /** Cents: negative = a credit that the next invoice uses. */
  balance: number;
  metadata: Record<string, string>;
}

export interface Price {
  id: string;
  object: 'price';
  active: boolean;
  livemode: false;
  lookup_key: string;
  currency: string;
  unit_amount: number;
  type: 'recurring';
  recurring: { interval: 'month'; interval_count: 1; usage_type: 'licensed' };
  product: string;
}

export interface CheckoutSession {
  id: string;
  object: 'checkout.session';
  created: number;
  livemode: false;
  mode: 'subscription';
  status: 'open' | 'complete' | 'expired';
  payment_status: 'paid' | 'unpaid';
  customer: string;
  client_reference_id: string | null;
  subscription: string | null;
  url: string | null;
  success_url: string;
  cancel_url: string | null;
  metadata: Record<string, string>;
}

export interface SubscriptionItem {
  id: string;
  object: 'subscription_item';
  subscription: string;
  price: Price;
  quantity: number;
  current_period_start: number;
  current_period_end: number;
}

export interface Subscription {
  id: string;
  object: 'subscription';
  created: number;
  livemode: false;
  customer: string;
  status: 'active' | 'past_due' | 'canceled';
  currency: string;
  items: List<SubscriptionItem>;
  cancel_at: number | null;
  cancel_at_period_end: boolean;
  canceled_at: number | null;
  ended_at: number | null;
  latest_invoice: string | null;
  metadata: Record<string, string>;
}

export interface InvoiceLine {
  id: string;
  object: 'line_item';
  amount: number;
  currency: string;
  description: string;
  quantity: number;
  period: { start: number; end: number };
  parent: {
    type: 'subscription_item_details';
    subscription_item_details: { subscription: string; subscription_item: string; proration: boolean };
  };
}

export interface Invoice {
  id?: string;
  object: 'invoice';
  created: number;
  livemode: false;
  customer: string;
  number: string | null;
  status: 'draft' | 'open' | 'paid' | 'void';
  billing_reason: 'subscription_create' | 'subscription_cycle' | 'subscription_update' | 'upcoming';
  currency: string;
  lines: List<InvoiceLine>;
  subtotal: number;
  total: number;
  starting_balance: number;
  ending_balance: number | null;
  amount_due: number;
  amount_paid: number;
  amount_remaining: number;
  attempt_count: number;
  next_payment_attempt: number | null;
  period_start: number;
  period_end: number;
  hosted_invoice_url: string | null;
  status_transitions: { finalized_at: number | null; paid_at: number | null; voided_at: number | null };
  parent: {
    type: 'subscription_details';
    subscription_details: { subscription: string; subscription_proration_date?: number };
  };
}

export interface PortalSession {
  id: string;
  object: 'billing_portal.session';
  created: number;
  livemode: false;
  customer: string;
  return_url: string | null;
  url: string;
}

export interface Event {
  id: string;
  object: 'event';
  api_version: string;
  created: number;
  livemode: false;
  type: string;
  data: { object: object };
  pending_webhooks: number;
  request: { id: string | null; idempotency_key: string | null };
}

export interface List<Item> {
  object: 'list';
  url: string;
  has_more: boolean;
  data: Item[];
}

/** What a card does when it is charged. */
export const CARDS = {
  pays: 'pays',
  declined: 'is declined',
  later: 'pays once and is declined later',
} as const;
export type Card = keyof typeof CARDS;
