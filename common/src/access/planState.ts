import { GRACE_DAYS, type Plan, PLAN_LIMITS, type Standing, STANDING_RULES, TRIAL_SEATS } from './plans.js';

const DAY_MS = 86_400_000;

/** Where a subscription stands with the payment service. */
export const SUBSCRIPTION_STATUSES = ['active', 'past-due', 'cancelled'] as const;
export type SubscriptionStatus = (typeof SUBSCRIPTION_STATUSES)[number];

/** What is stored of a team's trial and subscription: everything else follows from it and the clock. */
export interface SubscriptionFacts {
  /** null = the team has never paid. */
  status: SubscriptionStatus | null;
  /** Seats that are paid; 0 without a subscription. */
  seats: number;
  /** When the trial ends or ended; null = there was none. */
  trialEndsAt: Date | null;
  /** Since when a payment is missing; null unless the status is `past-due`. */
  pastDueSince: Date | null;
}

export interface PlanState {
  plan: Plan;
  standing: Standing;
  /** People that the team may have. */
  seats: number;
  /** When the standing ends by itself: the end of the trial, or of the days of grace; null = it doesn't. */
  until: Date | null;
}

const FREE: PlanState = { plan: 'free', standing: 'active', seats: PLAN_LIMITS.free.seats ?? 0, until: null };

/**
 * The plan that a team has at a moment. A subscription goes before a trial: paid, it is `active`; with a payment
 * missing it is `past-due` for 14 days and `unpaid` from then on; once ended it is `cancelled`. A trial counts until
 * its end, and leaves the team on Free. The end of a period belongs to what follows it.
 *
 * @param facts what is stored; null = nothing, the team is on Free
 * @param now the moment that is asked about
 * @example planState(null, new Date()).plan // 'free'
 */
export function planState(facts: SubscriptionFacts | null, now: Date): PlanState {
  if (facts === null) return FREE;
  const { status, seats, trialEndsAt } = facts;
  if (status === 'active') return { plan: 'team', standing: 'active', seats, until: null };
  if (status === 'past-due') return pastDueState(facts, now);
  if (status === 'cancelled') return stateOf('cancelled', 0);
  if (trialEndsAt === null) return FREE;
  return trialEndsAt > now ? stateOf('trial', TRIAL_SEATS, trialEndsAt) : stateOf('trial-over', FREE.seats);
}

function pastDueState({ seats, pastDueSince }: SubscriptionFacts, now: Date): PlanState {
  const until = new Date((pastDueSince ?? now).getTime() + GRACE_DAYS * DAY_MS);
  return until > now ? stateOf('past-due', seats, until) : stateOf('unpaid', seats);
}

function stateOf(standing: keyof typeof STANDING_RULES, seats: number, until: Date | null = null): PlanState {
  return { plan: STANDING_RULES[standing].plan, standing, seats, until };
}

/**
 * Days that are left until a moment, the begun one counted: 1 on the last day, 0 from the moment on.
 *
 * @example daysLeft(new Date('2026-01-02T00:00Z'), new Date('2026-01-01T12:00Z')) // 1
 */
export function daysLeft(until: Date, now: Date): number {
  return Math.max(0, Math.ceil((until.getTime() - now.getTime()) / DAY_MS));
}
