import type { OperatingConditions } from '../../conditions/index.js';
import { halfSource } from './halfSource.js';
import { invertingModel } from './inverting.js';
import { INTEGRAL, type Evaluate, type StageModel } from './model.js';

/**
 * Difference stage: each leg of the source through R_g to an input, R_f from the output to the − input and as
 * much from the + input to ground, R_f = gain·(R_g + R/2), C_in from each input to ground. Both legs being
 * equal, all transfers are those of the inverting stage of one leg: the current noise of the + input meets
 * 1/N of R_f and is amplified N times, so that it counts as that of the − input, and each resistor of the
 * network counts twice. The source's legs, R/2 each, together count as the whole R.
 *
 * The excess noise is that of all four resistors at the currents that a direct source voltage, half of it on
 * each leg, drives through them: see `currentsTogether`.
 *
 * Source: Motchenbacher & Connelly 1993 for the inverting stage; the rest by symmetry.
 */
export function differenceModel(conditions: OperatingConditions): StageModel {
  const { stage, source } = conditions;
  const { gain = 1, outputVoltage = 0 } = stage;
  const leg = invertingModel({
    ...conditions,
    source: halfSource(source),
    stage: { ...stage, biasResistance: 0, outputVoltage: outputVoltage * currentsTogether(gain) },
  });
  return { ...leg, compile: (nodes) => bothLegs(leg.compile(nodes)) };
}

/**
 * Root-sum-square of the direct currents of both legs, over V/R_f of an output voltage V. A source voltage V/gain
 * lifts both inputs to x·V, x = 1/(2·(1 + gain)): the leg of the + input carries x·V/R_f, the other (1 − x)·V/R_f.
 */
function currentsTogether(gain: number): number {
  const lift = 1 / (2 * (1 + gain));
  return Math.hypot(lift, 1 - lift);
}

function bothLegs(oneLeg: Evaluate): Evaluate {
  return (gainBandwidth, inputCapacitance, out) => {
    oneLeg(gainBandwidth, inputCapacitance, out);
    out[INTEGRAL.currentSourceWhite] = out[INTEGRAL.currentFeedbackWhite];
    out[INTEGRAL.currentSourceFlicker] = out[INTEGRAL.currentFeedbackFlicker];
    out[INTEGRAL.feedback] *= 2;
  };
}
