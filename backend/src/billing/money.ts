/** An amount in a currency's own unit, and not in its smallest one. */
export interface Money {
  /** Such as `19.00`; below zero = a credit. */
  amount: string;
  currency: string;
}

/** The service counts in the currency's smallest unit: 1900 of `eur` are 19.00 EUR, 1900 of `jpy` are 1900 JPY. */
export function toMoney(smallest: number, currency: string): Money {
  const code = currency.toUpperCase();
  const format = new Intl.NumberFormat('en', { style: 'currency', currency: code });
  const { maximumFractionDigits: digits = 2 } = format.resolvedOptions();
  return { amount: (smallest / 10 ** digits).toFixed(digits), currency: code };
}
