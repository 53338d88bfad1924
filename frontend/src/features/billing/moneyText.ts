import type { Money } from '../../api/billing';

/** An amount with its currency, such as "€152.00" or "−€57.00". */
export function moneyText({ amount, currency }: Money): string {
  const text = new Intl.NumberFormat('en-GB', { style: 'currency', currency }).format(Number(amount));
  return text.replace('-', '−');
}

/** What so many seats cost a month. */
export function monthlyText({ amount, currency }: Money, seats: number): string {
  return moneyText({ amount: String(Number(amount) * seats), currency });
}
