/** How many preferred values a series of IEC 60063 has in a decade. */
export const PREFERRED_SERIES = [3, 6, 12, 24, 48, 96, 192] as const;
export type PreferredSeries = (typeof PREFERRED_SERIES)[number];

/** Where the published E24 series departs from the rounded powers of ten, by place in the decade. */
const E24_EXCEPTIONS: Readonly<Record<number, number>> = {
  10: 2.7,
  11: 3.0,
  12: 3.3,
  13: 3.6,
  14: 3.9,
  15: 4.3,
  16: 4.7,
  22: 8.2,
};
const E192_EXCEPTIONS: Readonly<Record<number, number>> = { 185: 9.2 };

/**
 * The preferred values of one decade, from 1 to below 10, ascending: 10^(n/N), rounded to two digits up to
 * E24 and to three from E48 on, with the published exceptions; E3, E6 and E12 leave out places of E24,
 * E48 and E96 places of E192.
 *
 * Source: IEC 60063:2015.
 */
export function preferredValues(series: PreferredSeries): number[] {
  const whole = series <= 24 ? 24 : 192;
  return Array.from({ length: series }, (_, n) => valueAt((n * whole) / series, whole));
}

function valueAt(place: number, whole: 24 | 192): number {
  const exceptions = whole === 24 ? E24_EXCEPTIONS : E192_EXCEPTIONS;
  const digits = whole === 24 ? 10 : 100;
  return exceptions[place] ?? Math.round(10 ** (place / whole) * digits) / digits;
}

/**
 * The preferred values of a series over a range, ascending.
 *
 * @param from lower end of the range, > 0, itself included
 * @param to upper end, itself included; below `from` = none
 * @returns values rounded to the series' digits, such as 4.7e3
 * Source: IEC 60063:2015.
 */
export function preferredValuesBetween(series: PreferredSeries, from: number, to: number): number[] {
  const values: number[] = [];
  const mantissas = preferredValues(series);
  for (let decade = Math.floor(Math.log10(from)); 10 ** decade <= to; decade++) {
    for (const mantissa of mantissas) {
      const value = Number(`${mantissa}e${decade}`);
      if (value >= from && value <= to) values.push(value);
    }
  }
  return values;
}
