interface Price {
  amount: string;
  /** ISO 4217 */
  currency: string;
}

/** A price with its currency, such as "€1.85". */
export function priceText({ amount, currency }: Price): string {
  const maximumFractionDigits = decimalsOf(amount);
  return new Intl.NumberFormat('en-GB', { style: 'currency', currency, maximumFractionDigits }).format(
    Number(amount),
  );
}

/** Below one unit of the currency, fractions of a hundredth matter. */
export function decimalsOf(amount: string): number {
  return Number(amount) < 1 ? 4 : 2;
}
