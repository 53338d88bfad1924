import type { Money } from '../../api/billing';

/** An amount with its currency, such as "€152.00". */
export function moneyText({ amount, currency }: Money): string {
  return new Intl.NumberFormat('en-GB', { style: 'currency', currency }).format(Number(amount));
}

/** What so many seats cost a month. */
export function monthlyText({ amount, currency }: Money, seats: number): string {
  return moneyText({ amount: String(Number(amount) * seats), currency });
}

const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long' });

/** A moment's day, such as "15 December 2026". */
export function dayText(moment: string): string {
  return DAY.format(new Date(moment));
}
