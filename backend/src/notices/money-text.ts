import { shortPrice } from '@roothertz/common/prices';

/** An amount with two decimals, or more where it has them, and its currency: `1.23 EUR`, `0.0125 EUR`. */
export function moneyText(amount: string, currency: string): string {
  return `${shortPrice(amount)} ${currency}`;
}
