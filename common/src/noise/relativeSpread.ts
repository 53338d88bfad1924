import type { Origin } from '../parts/index.js';

/** Relative spread of a parameter below and above its figure. */
export interface Spread {
  below: number;
  above: number;
}

/**
 * How far a parameter may lie from its figure, by where the figure comes from: a data sheet's typical
 * value ±20 %, its maximum 0/−40 %, a measured value ±3 %, an estimate ±40 %; taken as one sigma.
 * Source: common practice, none published.
 */
export const ORIGIN_SPREAD: Record<Origin, Spread> = {
  typical: { below: 0.2, above: 0.2 },
  maximum: { below: 0.4, above: 0 },
  measured: { below: 0.03, above: 0.03 },
  estimated: { below: 0.4, above: 0.4 },
};
