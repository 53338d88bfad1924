/** An exact decimal number, coefficient · 10^exponent, in which values are put together without binary dust. */
export interface Decimal {
  coefficient: bigint;
  exponent: number;
}

/** The decimal of plain digits such as `-4.7`, times 10^exponent. */
export function decimalOf(digits: string, exponent = 0): Decimal {
  const [whole, part = ''] = digits.split('.');
  const coefficient = BigInt(whole + part);
  return { coefficient, exponent: coefficient === 0n ? 0 : exponent - part.length };
}

/** The shortest decimal that stands for a finite number. */
export function decimalOfNumber(value: number): Decimal {
  const [digits, exponent = '0'] = String(value).split('e');
  return decimalOf(digits, Number(exponent));
}

/** The nearest number; infinite or 0 beyond the range of numbers, NaN for an absurd exponent. */
export function decimalToNumber({ coefficient, exponent }: Decimal): number {
  return Number(`${coefficient}e${exponent}`);
}

/** The value times 10^exponent, exact. */
export function shiftDecimal(value: Decimal, exponent: number): Decimal {
  return value.coefficient === 0n ? value : { ...value, exponent: value.exponent + exponent };
}

/** The sum, exact. */
export function addDecimals(left: Decimal, right: Decimal): Decimal {
  const exponent = Math.min(left.exponent, right.exponent);
  return { coefficient: scaledTo(left, exponent) + scaledTo(right, exponent), exponent };
}

/** The value with the other sign. */
export function negateDecimal(value: Decimal): Decimal {
  return { ...value, coefficient: -value.coefficient };
}

/** value · numerator / denominator, exact where the quotient ends, else to thirty more digits. */
export function scaleDecimal(value: Decimal, numerator: bigint, denominator: bigint): Decimal {
  const coefficient = (value.coefficient * numerator * 10n ** 30n) / denominator;
  return { coefficient, exponent: value.exponent - 30 };
}

/** Whether a decimal is so far out of the range of numbers that arithmetic with it is pointless. */
export function isAbsurd({ coefficient, exponent }: Decimal): boolean {
  return !(Math.abs(exponent + String(coefficient).length) <= 400);
}

function scaledTo(value: Decimal, exponent: number): bigint {
  return value.coefficient * 10n ** BigInt(value.exponent - exponent);
}
