import { daysLeft, GRACE_DAYS } from '@roothertz/common/access';
import type { Billing } from '../../api/billing';
import { formatDay } from '../../components/formatDay';

type Stated = Pick<Billing, 'plan' | 'standing' | 'standingUntil'> &
  Partial<Pick<Billing, 'seats' | 'endsAt'>>;

/** How the team stands with its plan, in a few words. */
export function planHeadline({ plan, standing, standingUntil, seats, endsAt }: Stated): string {
  if (standing === 'active' && plan === 'free') return 'Free plan';
  if (standing === 'active')
    return `Team plan${seatsText(seats)}${endsAt ? `, until ${formatDay(endsAt)}` : ''}`;
  if (standing === 'trial') return `Team plan on trial: ${daysText(standingUntil)} left`;
  if (standing === 'trial-over') return 'Free plan: the trial is over';
  if (standing === 'past-due') return 'Team plan: a payment is missing';
  return standing === 'unpaid' ? 'Read-only: a payment is missing' : 'Read-only: the plan is cancelled';
}

function seatsText(seats: number | undefined): string {
  if (seats === undefined) return '';
  return seats === 1 ? ', one seat' : `, ${seats} seats`;
}

/** What that means for the team, and what to do. */
export function planMeaning(billing: Stated): string {
  const { plan, standing, standingUntil, endsAt } = billing;
  if (standing === 'trial')
    return `Everything works until ${untilText(standingUntil)}. The team is on Free from then on: what it has stays readable.`;
  if (standing === 'trial-over')
    return 'The team’s library and prices are all there to read and export. Buy the Team plan to go on with them.';
  if (standing === 'past-due')
    return `The last payment has failed. Everything works until ${untilText(standingUntil)}; the team is read-only from then on, and nothing is deleted. Use another card under “Card and cancellation”.`;
  if (standing === 'unpaid')
    return `A payment has been missing for more than ${GRACE_DAYS} days. Everything can be read and exported, and nothing changed. Pay what is open under “Card and cancellation”.`;
  if (standing === 'cancelled')
    return 'Everything can be read and exported, and nothing changed. Buy the plan again to go on where the team left off.';
  if (plan === 'free')
    return 'One person, the curated library and the whole ranking. A library of the team’s own needs the Team plan.';
  return endsAt
    ? `The plan is cancelled and ends on ${formatDay(endsAt)}. The team is read-only from then on, and nothing is deleted.`
    : 'Everything is included.';
}

function daysText(until: string | null, now = new Date()): string {
  const days = until === null ? 0 : daysLeft(new Date(until), now);
  return days === 1 ? '1 day' : `${days} days`;
}

function untilText(until: string | null): string {
  return until === null ? 'further notice' : formatDay(until);
}
