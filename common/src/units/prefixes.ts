/** The SI prefixes in steps of a thousand, yocto to yotta (SI Brochure, 9th ed., table 7); empty = none. */
export const PREFIXES = {
  y: -24,
  z: -21,
  a: -18,
  f: -15,
  p: -12,
  n: -9,
  µ: -6,
  m: -3,
  '': 0,
  k: 3,
  M: 6,
  G: 9,
  T: 12,
  P: 15,
  E: 18,
  Z: 21,
  Y: 24,
} as const;

export type Prefix = keyof typeof PREFIXES;

/** Prefixes as people write them, each with its power of ten: ASCII `u`, capital `K` and `meg` count as well. */
export const TYPED_PREFIXES: Readonly<Record<string, number>> = { ...PREFIXES, u: -6, K: 3 };

/** Prefixes that may stand without a unit; the rare ones are left out, since `5a` or `5E` is a slip. */
const ALONE = /^(?:[fpnuµmkKMGT]|meg)$/;

/** The power of ten of a prefix that stands without a unit, or null. */
export function loneExponent(text: string): number | null {
  const symbol = text.toLowerCase() === 'meg' ? 'meg' : text;
  if (!ALONE.test(symbol)) return null;
  return symbol === 'meg' ? PREFIXES.M : TYPED_PREFIXES[symbol];
}

/** The prefix for a decimal exponent, so that one to three digits stand before the mark; null beyond y…Y. */
export function prefixFor(exponent: number): Prefix | null {
  const step = Math.floor(exponent / 3) * 3;
  const found = Object.entries(PREFIXES).find(([, power]) => power === step);
  return found ? (found[0] as Prefix) : null;
}
