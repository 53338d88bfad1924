import { describe, expect, it } from 'vitest';
import { daysLeft, planState, type SubscriptionFacts, TRIAL_SEATS } from './index.js';

const NOW = new Date('2026-06-15T12:00:00Z');
const days = (count: number) => new Date(NOW.getTime() + count * 86_400_000);
const facts = (changes: Partial<SubscriptionFacts>): SubscriptionFacts => ({
  status: null,
  seats: 0,
  trialEndsAt: null,
  pastDueSince: null,
  ...changes,
});
const stateOf = (changes: Partial<SubscriptionFacts>) => planState(facts(changes), NOW);

describe('the state of a plan', () => {
  it('is Free with one seat where nothing is stored, and where nothing was ever paid or tried', () => {
    const free = { plan: 'free', standing: 'active', seats: 1, until: null };
    expect(planState(null, NOW)).toEqual(free);
    expect(stateOf({})).toEqual(free);
  });

  it('is Team with the paid seats while the subscription is paid, whatever became of the trial', () => {
    const active = { plan: 'team', standing: 'active', seats: 7, until: null };
    expect(stateOf({ status: 'active', seats: 7 })).toEqual(active);
    expect(stateOf({ status: 'active', seats: 7, trialEndsAt: days(-40) })).toEqual(active);
    expect(stateOf({ status: 'active', seats: 7, trialEndsAt: days(3) })).toEqual(active);
  });

  it('is a trial until its end, and Free from that moment on', () => {
    expect(stateOf({ trialEndsAt: days(2) })).toEqual({
      plan: 'team',
      standing: 'trial',
      seats: TRIAL_SEATS,
      until: days(2),
    });
    for (const trialEndsAt of [NOW, days(-1)])
      expect(stateOf({ trialEndsAt })).toEqual({
        plan: 'free',
        standing: 'trial-over',
        seats: 1,
        until: null,
      });
  });

  it('is past due for fourteen days after a payment failed, and unpaid from that moment on', () => {
    const missing = (pastDueSince: Date) => stateOf({ status: 'past-due', seats: 4, pastDueSince });
    expect(missing(days(-13.9))).toMatchObject({ plan: 'team', standing: 'past-due', until: days(0.1) });
    expect(missing(days(-14))).toEqual({ plan: 'team', standing: 'unpaid', seats: 4, until: null });
  });

  it('is cancelled without seats once the subscription has ended, even if a trial would still run', () => {
    expect(stateOf({ status: 'cancelled', seats: 4, trialEndsAt: days(3) })).toEqual({
      plan: 'team',
      standing: 'cancelled',
      seats: 0,
      until: null,
    });
  });
});

describe('daysLeft', () => {
  it.each([
    [14, 14],
    [13.2, 14],
    [0.01, 1],
    [0, 0],
    [-5, 0],
  ])('counts %d days as %d', (ahead, left) => {
    expect(daysLeft(days(ahead), NOW)).toBe(left);
  });
});
