import type { RankingItem } from '../../api/ranking';

type Price = NonNullable<RankingItem['unitPrice']>;

/** The price alone, for a column whose heading names the currency: at least two decimals, all that it has up to four. */
export function amountText({ amount }: Pick<Price, 'amount'>): string {
  return new Intl.NumberFormat('en-GB', { minimumFractionDigits: 2, maximumFractionDigits: 4 }).format(
    Number(amount),
  );
}

/** The price with its currency, such as "€1.85". */
export function priceText({ amount, currency }: Pick<Price, 'amount' | 'currency'>): string {
  return new Intl.NumberFormat('en-GB', { style: 'currency', currency, maximumFractionDigits: 4 }).format(
    Number(amount),
  );
}

/** "€ at 250", or null where no part has a price. */
export function priceHeading(items: readonly RankingItem[], quantity: number): string | null {
  const currency = items.find(({ unitPrice }) => unitPrice !== null)?.unitPrice?.currency;
  if (currency === undefined) return null;
  const parts = new Intl.NumberFormat('en-GB', { style: 'currency', currency }).formatToParts(0);
  return `${parts.find(({ type }) => type === 'currency')!.value} at ${quantity}`;
}
