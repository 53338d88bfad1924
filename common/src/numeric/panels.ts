/**
 * Where an integrand is sharp on the real axis: poles whose real parts lie in [from, to], at the
 * distance `width` from the axis.
 */
export interface Feature {
  from: number;
  to: number;
  width: number;
}

/** A panel may be this many times as long as its middle is far from the nearest pole. */
const LENGTH_OVER_DISTANCE = 1.6;

/**
 * Splits [from, to] into panels for a fixed-order quadrature rule, short near the poles of the integrand
 * and growing geometrically away from them, so that the rule converges alike in each panel.
 *
 * @param from lower end
 * @param to upper end, above `from`
 * @param features the integrand's poles
 * @param longest the longest panel allowed where no pole is near
 * @returns the panel boundaries in ascending order, both ends included
 */
export function gradedPanels(
  from: number,
  to: number,
  features: readonly Feature[],
  longest: number,
): number[] {
  const count = Math.max(1, Math.ceil((to - from) / longest));
  const boundaries = [from];
  for (let i = 0; i < count; i++) {
    const end = i === count - 1 ? to : from + ((i + 1) * (to - from)) / count;
    split(boundaries[boundaries.length - 1], end, features, boundaries);
  }
  return boundaries;
}

function split(from: number, to: number, features: readonly Feature[], boundaries: number[]): void {
  const middle = (from + to) / 2;
  if (to - from <= LENGTH_OVER_DISTANCE * distance(middle, features) || middle <= from || middle >= to) {
    boundaries.push(to);
    return;
  }
  split(from, middle, features, boundaries);
  split(middle, to, features, boundaries);
}

function distance(x: number, features: readonly Feature[]): number {
  let nearest = Infinity;
  for (const { from, to, width } of features) {
    const here = Math.hypot(Math.max(0, from - x, x - to), width);
    if (here < nearest) nearest = here;
  }
  return nearest;
}
