import { INTEGRAL, INTEGRALS, type Evaluate } from '../stage/model.js';

/** What the fit of a parabola may lose to rounding, of its greatest value. */
const FIT_ROUNDING = 1e-13;

/**
 * The least that each integral of a stage, over that of the source, can be for any input capacitance between two
 * (F), where it is a quadratic function of the capacitance: an amplifier adds no less than these times its generators.
 */
export function leastAddedIntegrals(evaluate: Evaluate, from: number, to: number): Float64Array {
  const [atFrom, between, atTo] = [from, (from + to) / 2, to].map((capacitance) => {
    const integrals = new Float64Array(INTEGRALS);
    evaluate(Infinity, capacitance, integrals);
    return integrals.map((integral) => integral / integrals[INTEGRAL.source]);
  });
  return atFrom.map((_, n) => leastOfParabola(atFrom[n], between[n], atTo[n]));
}

/** The least value, not below 0, between the ends of a parabola through a beginning, a middle and an end. */
function leastOfParabola(beginning: number, middle: number, end: number): number {
  const curvature = 2 * (beginning - 2 * middle + end);
  const slope = end - beginning - curvature;
  const turnsBetween = slope < 0 && slope + 2 * curvature > 0;
  const least = turnsBetween ? beginning - slope ** 2 / (4 * curvature) : Math.min(beginning, end);
  return Math.max(0, least - FIT_ROUNDING * Math.max(beginning, end));
}
