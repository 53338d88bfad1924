import { groupThousands, scientific, trimZeros, writeExponent, writePlain } from './scientific.js';

/**
 * A finite number over 10^shift without prefix: `digits` significant digits, but no digit before the mark is rounded
 * away; thin spaces group thousands; exponent form from 1e15 on and below 1e-6. Zero is `0`.
 */
export function plainNumber(value: number, digits: number, shift = 0): string {
  if (value === 0) return '0';
  const power = scientific(value, digits).exponent - shift;
  if (power < -6 || power >= 15) return writeExponent(scientific(value, digits), shift);
  return groupThousands(writePlain(scientific(value, Math.max(digits, power + 1)), shift));
}

/** All digits of a finite number over 10^shift, as few as give it back, without grouping. */
export function shortestNumber(value: number, shift = 0): string {
  if (value === 0) return '0';
  const exact = scientific(value);
  const power = exact.exponent - shift;
  const text = power < -6 || power >= 15 ? writeExponent(exact, shift) : writePlain(exact, shift);
  return trimZeros(text);
}
