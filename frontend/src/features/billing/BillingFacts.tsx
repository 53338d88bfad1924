import type { Billing } from '../../api/billing';
import { Facts } from '../../components/Facts';
import { formatDay } from '../../components/formatDay';
import { moneyText } from './moneyText';

/** Seats, price and next invoice on lines. */
export function BillingFacts({ billing }: { billing: Billing }) {
  const { seats, usedSeats, payment, granted, endsAt, standing } = billing;
  const entries = [{ term: 'Seats', value: seatsText(seats, usedSeats) }];
  if (granted) entries.push({ term: 'Payment', value: 'granted without payment' });
  if (payment) entries.push({ term: 'Price', value: `${moneyText(payment.seatPrice)} a seat and month` });
  if (payment?.next) entries.push({ term: 'Next invoice', value: nextText(payment.next) });
  if (endsAt !== null)
    entries.push({ term: standing === 'cancelled' ? 'Ended on' : 'Ends on', value: formatDay(endsAt) });
  return <Facts label="Plan" entries={entries} />;
}

function seatsText(seats: number, used: number): string {
  return seats === 0 ? `none paid, ${used} taken` : `${used} of ${seats} taken`;
}

function nextText({ at, ...money }: NonNullable<NonNullable<Billing['payment']>['next']>): string {
  return `${moneyText(money)} on ${formatDay(at)}`;
}
