/** The codes of all currencies in use (ISO 4217). */
export const CURRENCIES: readonly string[] = Intl.supportedValuesOf('currency');

const CODES = new Set(CURRENCIES);

/** What is wrong with the code of a currency, in words, or null. */
export function currencyError(code: unknown): string | null {
  return typeof code === 'string' && CODES.has(code)
    ? null
    : 'currency: a code of ISO 4217 such as EUR was expected';
}
