import type { StageConditions } from '../../conditions/index.js';
import { excessPowerDensity } from '../excess.js';

/** Squared excess noise of R_g and R_f at 1 Hz in V²/Hz, in series with the resistor; it falls with 1/f. */
export interface NetworkExcess {
  gain: number;
  feedback: number;
}

/**
 * The excess noise of the feedback network that a direct current makes.
 *
 * @param current A through both resistors, either sign
 * @param gainResistance Ω, R_g
 * @param feedbackResistance Ω, R_f
 * @returns 0 for a resistor whose noise index isn't stated
 * Source: IEC 60195.
 */
export function networkExcess(
  { gainNoiseIndex, feedbackNoiseIndex }: StageConditions,
  current: number,
  gainResistance: number,
  feedbackResistance: number,
): NetworkExcess {
  const at = (noiseIndex: number | undefined, resistance: number) =>
    noiseIndex === undefined || resistance === 0
      ? 0
      : excessPowerDensity(noiseIndex, current * resistance, 1);
  return { gain: at(gainNoiseIndex, gainResistance), feedback: at(feedbackNoiseIndex, feedbackResistance) };
}
