/** An amount with two decimals, or more where it has them, and its currency: `1.23 EUR`, `0.0125 EUR`. */
export function moneyText(amount: string, currency: string): string {
  return `${amountText(amount)} ${currency}`;
}

/** As {@link moneyText}, without the currency. */
export function amountText(amount: string): string {
  const [whole, decimals = ''] = amount.split('.');
  return `${whole}.${decimals.replace(/0+$/, '').padEnd(2, '0')}`;
}
