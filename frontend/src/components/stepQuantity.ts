import type { QuantityKind } from '@roothertz/common/units';

/** The E12 series of IEC 60063. */
const E12 = [1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2];
const IN_STEPS_OF_ONE: readonly QuantityKind[] = ['temperature', 'count', 'decibel'];

/** The next value that an arrow key gives: one up or down, or the next of the E12 series. */
export function stepQuantity(value: number, kind: QuantityKind, direction: 1 | -1): number {
  if (IN_STEPS_OF_ONE.includes(kind)) return value + direction;
  return value > 0 ? nextOfSeries(value, direction) : value;
}

function nextOfSeries(value: number, direction: 1 | -1): number {
  const decade = Math.floor(Math.log10(value));
  const series = [decade - 1, decade, decade + 1].flatMap((exponent) =>
    E12.map((mantissa) => Number(`${mantissa}e${exponent}`)),
  );
  const next =
    direction > 0
      ? series.find((candidate) => candidate > value * (1 + 1e-9))
      : series.findLast((candidate) => candidate < value * (1 - 1e-9));
  return next ?? value;
}
