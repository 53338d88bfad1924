import { CONTRIBUTORS, type Contributions, type Contributor } from './contributors.js';
import type { Spread } from './relativeSpread.js';
import { INTEGRAL } from './stage/model.js';

/** An amplifier's generators at the ambient temperature: squared densities and corners, nothing unknown. */
export interface Generators {
  /** V²/Hz */
  voltage2: number;
  /** Hz */
  voltageCorner: number;
  /** A²/Hz */
  current2: number;
  /** Hz */
  currentCorner: number;
}

/**
 * Powers at the output by contributor in V², from a stage's integrals and an amplifier's generators: each
 * integral times its generator's e_n², e_n²·f_ce, i_n² or i_n²·f_ci.
 */
export function outputPowers(integrals: Float64Array, generators: Generators): Contributions {
  const { voltage2, voltageCorner, current2, currentCorner } = generators;
  const shaped = (white: number, flicker: number, corner: number) =>
    integrals[white] + corner * integrals[flicker];
  return {
    source: integrals[INTEGRAL.source],
    amplifierVoltage: voltage2 * shaped(INTEGRAL.voltageWhite, INTEGRAL.voltageFlicker, voltageCorner),
    amplifierCurrentSource:
      current2 * shaped(INTEGRAL.currentSourceWhite, INTEGRAL.currentSourceFlicker, currentCorner),
    amplifierCurrentFeedback:
      current2 * shaped(INTEGRAL.currentFeedbackWhite, INTEGRAL.currentFeedbackFlicker, currentCorner),
    feedback: integrals[INTEGRAL.feedback],
    bias: integrals[INTEGRAL.bias],
    excess: integrals[INTEGRAL.excess],
  };
}

/** The whole power at the output in V²: the sum of `outputPowers`, without making the budget. */
export function outputPower(integrals: Float64Array, generators: Generators): number {
  return integrals[INTEGRAL.source] + addedPower(integrals, generators);
}

/** The power at the output in V² of all but the source. */
export function addedPower(integrals: Float64Array, generators: Generators): number {
  const { voltage2, voltageCorner, current2, currentCorner } = generators;
  return (
    integrals[INTEGRAL.feedback] +
    integrals[INTEGRAL.bias] +
    integrals[INTEGRAL.excess] +
    voltage2 * (integrals[INTEGRAL.voltageWhite] + voltageCorner * integrals[INTEGRAL.voltageFlicker]) +
    current2 *
      (integrals[INTEGRAL.currentSourceWhite] +
        integrals[INTEGRAL.currentFeedbackWhite] +
        currentCorner *
          (integrals[INTEGRAL.currentSourceFlicker] + integrals[INTEGRAL.currentFeedbackFlicker]))
  );
}

/** The power at the output in V² that source and resistors make, whatever the amplifier's own noise. */
export function fixedPower(integrals: Float64Array): number {
  return (
    integrals[INTEGRAL.source] +
    integrals[INTEGRAL.feedback] +
    integrals[INTEGRAL.bias] +
    integrals[INTEGRAL.excess]
  );
}

/** How far an amplifier's four noise parameters may lie from their figures. */
export interface NoiseSpreads {
  voltageNoise: Spread;
  voltageNoiseCorner: Spread;
  currentNoise: Spread;
  currentNoiseCorner: Spread;
}

/**
 * Relative spread of a total rms that follows from the spreads of the amplifier's noise parameters:
 * each parameter's spread times the share of the power that it makes (half of the 1/f share for a
 * corner), as root-sum-square.
 *
 * @param power the whole power at the output, V²
 * Source: Gaussian propagation of uncertainty, JCGM 100:2008 (GUM), 5.1.2.
 */
export function totalSpread(
  integrals: Float64Array,
  generators: Generators,
  spreads: NoiseSpreads,
  power: number,
): Spread {
  const { voltage2, voltageCorner, current2, currentCorner } = generators;
  const voltageFlicker = voltage2 * voltageCorner * integrals[INTEGRAL.voltageFlicker];
  const voltage = voltage2 * integrals[INTEGRAL.voltageWhite] + voltageFlicker;
  const currentFlicker =
    current2 *
    currentCorner *
    (integrals[INTEGRAL.currentSourceFlicker] + integrals[INTEGRAL.currentFeedbackFlicker]);
  const current =
    current2 * (integrals[INTEGRAL.currentSourceWhite] + integrals[INTEGRAL.currentFeedbackWhite]) +
    currentFlicker;
  const spread = (side: keyof Spread) =>
    Math.sqrt(
      (voltage * spreads.voltageNoise[side]) ** 2 +
        ((voltageFlicker / 2) * spreads.voltageNoiseCorner[side]) ** 2 +
        (current * spreads.currentNoise[side]) ** 2 +
        ((currentFlicker / 2) * spreads.currentNoiseCorner[side]) ** 2,
    ) / power;
  return { below: spread('below'), above: spread('above') };
}

/** The contributor with the largest power. */
export function dominantContributor(powers: Contributions): Contributor {
  return CONTRIBUTORS.reduce((largest, contributor) =>
    powers[contributor] > powers[largest] ? contributor : largest,
  );
}
