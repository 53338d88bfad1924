import type { PricePlot, PricePoint } from './pricePlot';

export const PRICE_WIDTH = 336;
export const PRICE_HEIGHT = 300;
const [LEFT, RIGHT, TOP, BOTTOM] = [44, 12, 24, 36];

/** The plot's field in pixels, both axes logarithmic. */
export interface PriceGeometry {
  left: number;
  right: number;
  top: number;
  bottom: number;
  xOf: (price: number) => number;
  yOf: (noise: number) => number;
  priceTicks: number[];
  noiseTicks: number[];
}

export function priceGeometry({ points, floor }: PricePlot): PriceGeometry {
  const prices = rangeOf(points.map(({ price }) => price).filter((price) => price > 0));
  const noises = rangeOf([...points.map(({ noise }) => noise), ...(floor > 0 ? [floor] : [])]);
  const [right, bottom] = [PRICE_WIDTH - RIGHT, PRICE_HEIGHT - BOTTOM];
  return {
    left: LEFT,
    right,
    top: TOP,
    bottom,
    xOf: (price) => LEFT + along(price, prices) * (right - LEFT),
    yOf: (noise) => bottom - along(noise, noises) * (bottom - TOP),
    priceTicks: ticksOf(prices),
    noiseTicks: ticksOf(noises),
  };
}

type Range = [number, number];

const ROOM = 0.06;
/** The ends of an axis lie at least so far apart. */
const NARROW = 2.5;

/** The values with some room around them. */
function rangeOf(values: readonly number[]): Range {
  if (values.length === 0) return [1, 10];
  const [least, most] = [Math.min(...values), Math.max(...values)];
  const ratio = most / least;
  const room = Math.max(ratio ** ROOM, Math.sqrt(NARROW / ratio));
  return [least / room, most * room];
}

/** Free parts lie on the axis: 0 has no logarithm. */
function along(value: number, [from, to]: Range): number {
  return value <= 0 ? 0 : Math.log(value / from) / Math.log(to / from);
}

const FEWEST_TICKS = 3;

/** Round values in a range: decades where there are enough, else 1, 2, 5 of each, else any single digit. */
function ticksOf(range: Range): number[] {
  const kinds = [[1], [1, 2, 5], [1, 1.5, 2, 3, 4, 5, 6, 7, 8, 9]];
  const ticks = kinds.map((digits) => stepsOf(range, digits));
  return ticks.find(({ length }) => length >= FEWEST_TICKS) ?? ticks[2];
}

function stepsOf([from, to]: Range, digits: readonly number[]): number[] {
  const first = Math.floor(Math.log10(from));
  const decades = Array.from({ length: Math.ceil(Math.log10(to)) - first + 1 }, (_none, n) => first + n);
  return decades
    .flatMap((decade) => digits.map((digit) => Number(`${digit}e${decade}`)))
    .filter((value) => value >= from && value <= to);
}

/** The frontier as steps: what the least noise is for at most a price. */
export function frontierPath(points: readonly PricePoint[], { xOf, yOf, right }: PriceGeometry): string {
  const steps = points
    .filter(({ isOnFrontier }) => isOnFrontier)
    .map(({ price, noise }) => [xOf(price), yOf(noise)]);
  const lines = steps.map(([x, y], n) => (n === 0 ? `M${fixed(x)} ${fixed(y)}` : `H${fixed(x)}V${fixed(y)}`));
  return steps.length === 0 ? '' : `${lines.join('')}H${fixed(right)}`;
}

function fixed(value: number): string {
  return value.toFixed(1);
}

/** The point nearest to a place of the drawing; undefined where there is none. */
export function nearestPoint(
  points: readonly PricePoint[],
  { xOf, yOf }: PriceGeometry,
  x: number,
  y: number,
): PricePoint | undefined {
  const distance = ({ price, noise }: PricePoint) => Math.hypot(xOf(price) - x, yOf(noise) - y);
  return points.reduce<PricePoint | undefined>(
    (best, point) => (best === undefined || distance(point) < distance(best) ? point : best),
    undefined,
  );
}
