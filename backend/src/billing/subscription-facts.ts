import type { SubscriptionStatus } from '@roothertz/common/access';
import type Stripe from 'stripe';

/** What is kept of a subscription at the payment service. */
export interface PaidFacts {
  subscriptionId: string;
  status: SubscriptionStatus;
  seats: number;
  currentPeriodEnd: Date | null;
  endsAt: Date | null;
  pastDueSince: Date | null;
}

/** The service's word → ours; a subscription whose first payment never came counts for nothing. */
const STATUSES: Partial<Record<string, SubscriptionStatus>> = {
  active: 'active',
  trialing: 'active',
  past_due: 'past-due',
  unpaid: 'past-due',
  paused: 'past-due',
  canceled: 'cancelled',
};

const RANK: Record<SubscriptionStatus, number> = { active: 0, 'past-due': 1, cancelled: 2 };

export function statusOf({ status }: Stripe.Subscription): SubscriptionStatus | null {
  return STATUSES[status] ?? null;
}

/** The subscription that counts among all of a customer's: a paid one before any other, then the newest. */
export function chooseSubscription(all: readonly Stripe.Subscription[]): Stripe.Subscription | null {
  const counting = all.flatMap((subscription) => {
    const status = statusOf(subscription);
    return status === null ? [] : [{ subscription, rank: RANK[status] }];
  });
  counting.sort(
    (one, other) => one.rank - other.rank || other.subscription.created - one.subscription.created,
  );
  return counting[0]?.subscription ?? null;
}

/**
 * What is kept of a subscription.
 *
 * @param open its invoices that wait for payment
 * @param known since when a payment was missing as far as was known
 * @param now a service whose clock is ahead gives no longer grace
 */
export function subscriptionFacts(
  subscription: Stripe.Subscription,
  open: readonly Stripe.Invoice[],
  known: Date | null,
  now: Date,
): PaidFacts | null {
  const status = statusOf(subscription);
  if (status === null) return null;
  return {
    subscriptionId: subscription.id,
    status,
    seats: subscription.items.data.reduce((sum, { quantity }) => sum + (quantity ?? 0), 0),
    currentPeriodEnd: dateOf(subscription.items.data[0]?.current_period_end),
    endsAt: endOf(subscription),
    pastDueSince: status === 'past-due' ? pastDueSince(open, known, now) : null,
  };
}

/** A cancellation says when it takes effect by date, by “at the period's end”, or by having happened. */
function endOf({ ended_at, cancel_at, cancel_at_period_end, items }: Stripe.Subscription): Date | null {
  const periodEnd = cancel_at_period_end ? items.data[0]?.current_period_end : null;
  return dateOf(ended_at ?? cancel_at ?? periodEnd);
}

function pastDueSince(open: readonly Stripe.Invoice[], known: Date | null, now: Date): Date {
  const finalized = open.map(({ status_transitions, created }) => status_transitions.finalized_at ?? created);
  const since = finalized.length > 0 ? new Date(Math.min(...finalized) * 1000) : (known ?? now);
  return since < now ? since : now;
}

function dateOf(seconds: number | null | undefined): Date | null {
  return typeof seconds === 'number' ? new Date(seconds * 1000) : null;
}
