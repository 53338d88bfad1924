import type { RankingItem } from '../../api/ranking';
import { decimalsOf } from '../../components/priceText';

type Price = NonNullable<RankingItem['unitPrice']>;

/** The price alone, for a column whose heading names the currency. */
export function amountText({ amount }: Pick<Price, 'amount'>): string {
  const maximumFractionDigits = decimalsOf(amount);
  return new Intl.NumberFormat('en-GB', { minimumFractionDigits: 2, maximumFractionDigits }).format(
    Number(amount),
  );
}

/** "€ at 250", or null where no part has a price. */
export function priceHeading(
  items: readonly { unitPrice: Pick<Price, 'currency'> | null }[],
  quantity: number,
): string | null {
  const currency = items.find(({ unitPrice }) => unitPrice !== null)?.unitPrice?.currency;
  if (currency === undefined) return null;
  const parts = new Intl.NumberFormat('en-GB', { style: 'currency', currency }).formatToParts(0);
  return `${parts.find(({ type }) => type === 'currency')!.value} at ${quantity}`;
}
