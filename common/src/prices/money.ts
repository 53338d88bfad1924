/**
 * Exact amounts: a decimal text such as `1.23` as a whole number of its smallest places, 12300n at four
 * decimals. Sums, products and comparisons of such numbers lose nothing.
 */

/** The decimals that a unit price may have. */
export const PRICE_DECIMALS = 4;
/** The decimals that an exchange rate may have. */
export const RATE_DECIMALS = 8;

/**
 * The scaled number of a decimal text that is not negative; places beyond `decimals` are dropped.
 *
 * @param text digits with at most one point, as `readPrice` and the database give it; not checked here
 * @example toScaled('1.23', 4) // 12300n
 */
export function toScaled(text: string, decimals: number): bigint {
  const [whole, fraction = ''] = text.split('.');
  return BigInt(whole + fraction.padEnd(decimals, '0').slice(0, decimals));
}

/** The decimal text of a scaled number that is not negative: `scaledText(12300n, 4)` is `1.2300`. */
export function scaledText(value: bigint, decimals: number): string {
  const digits = String(value).padStart(decimals + 1, '0');
  return decimals === 0 ? digits : `${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`;
}

/** A scaled number at fewer decimals, halves away from 0. */
export function rescaled(value: bigint, from: number, to: number): bigint {
  return dividedHalfUp(value, 10n ** BigInt(from - to));
}

/** The quotient of numbers that are not negative as the nearest whole number, halves away from 0. */
export function dividedHalfUp(dividend: bigint, divisor: bigint): bigint {
  return (2n * dividend + divisor) / (2n * divisor);
}

/** A unit price in the form in which it is kept: with all its decimals. */
export function priceText(text: string): string {
  return scaledText(toScaled(text, PRICE_DECIMALS), PRICE_DECIMALS);
}

/** A unit price with two decimals, or more where it has them: `4.6900` is `4.69`, `0.0125` stays, `4` is `4.00`. */
export function shortPrice(unitPrice: string): string {
  const [whole, decimals = ''] = unitPrice.split('.');
  return `${whole}.${decimals.replace(/0+$/, '').padEnd(2, '0')}`;
}
