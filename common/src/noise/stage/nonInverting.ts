import type { OperatingConditions, StageConditions } from '../../conditions/index.js';
import { polynomialRoots } from '../../numeric/index.js';
import { dividerGrowth, dividerNodes, dividerPowers, type InputCircuit } from './divider.js';
import { INTEGRAL, quadraticQuality, type Evaluate, type StageModel } from './model.js';
import { networkExcess } from './networkExcess.js';
import type { Nodes } from './nodes.js';

/**
 * Follower and non-inverting stage. With Z = R + jωL and C the source's and the input capacitance,
 * D = 1 + Z·(jωC + 1/R_L) divides the source's voltage, and Z/D is the impedance that the current noise of
 * the + input sees. Noise gain N = gain; the closed loop is N/(1 + jf·N/GBW).
 * Source: Motchenbacher & Connelly 1993.
 */
export function nonInvertingModel({ source, stage }: OperatingConditions): StageModel {
  const gain = stage.gain ?? 1;
  const gainResistance = gain > 1 ? (stage.gainResistance ?? 0) : 0;
  const input: InputCircuit = {
    ...source,
    loadConductance: stage.loadResistance === undefined ? 0 : 1 / stage.loadResistance,
  };
  return {
    compile: (nodes) =>
      compile(nodes, {
        ...input,
        gain,
        parallel: gainResistance * (1 - 1 / gain),
        excess: excessAtOutput(stage, gain, gainResistance),
      }),
    noiseGain: () => gain,
    crossoverNoiseGain: () => gain,
    poles: (gainBandwidth, inputCapacitance) => [
      ...polynomialRoots(dividerPowers(input, inputCapacitance)),
      ...(Number.isFinite(gainBandwidth) ? [{ re: (-2 * Math.PI * gainBandwidth) / gain, im: 0 }] : []),
    ],
    quality: (_gainBandwidth, inputCapacitance) =>
      source.inductance === 0 ? 0 : quadraticQuality(...dividerPowers(input, inputCapacitance)),
    growth: (inputCapacitance) => dividerGrowth(input, inputCapacitance),
    canNotch: false,
    spotIsQuadratic: true,
    resistive: source.inductance === 0 && source.capacitance === 0,
    networkResistance: gainResistance > 0 ? gainResistance * gain : Infinity,
  };
}

interface Circuit extends InputCircuit {
  gain: number;
  /** R_f ∥ R_g */
  parallel: number;
  /** squared excess noise of the network at the output at 1 Hz, V²/Hz */
  excess: number;
}

/** The noise of R_f counts once, that of R_g R_f/R_g times; the direct output voltage drives both. */
function excessAtOutput(stage: StageConditions, gain: number, gainResistance: number): number {
  if (gainResistance === 0) return 0;
  const current = (stage.outputVoltage ?? 0) / (gainResistance * gain);
  const { gain: ofGain, feedback } = networkExcess(
    stage,
    current,
    gainResistance,
    gainResistance * (gain - 1),
  );
  return feedback + ofGain * (gain - 1) ** 2;
}

function compile(nodes: Nodes, circuit: Circuit): Evaluate {
  const { gain, loadConductance, parallel, excess } = circuit;
  const { count, white, flicker, sourcePower, ambientPower } = nodes;
  const { real, imaginary, realPerFarad, imaginaryPerFarad, impedance2 } = dividerNodes(nodes, circuit);
  const frequency2 = nodes.frequency.map((frequency) => frequency ** 2);
  return (gainBandwidth, inputCapacitance, out) => {
    const slowness = (gain / gainBandwidth) ** 2;
    let voltageWhite = 0;
    let voltageFlicker = 0;
    let source = 0;
    let currentWhite = 0;
    let currentFlicker = 0;
    let feedback = 0;
    let bias = 0;
    for (let k = 0; k < count; k++) {
      const re = real[k] + realPerFarad[k] * inputCapacitance;
      const im = imaginary[k] + imaginaryPerFarad[k] * inputCapacitance;
      const divider2 = re * re + im * im;
      const both = 1 / (divider2 * (1 + frequency2[k] * slowness));
      const loop = both * divider2;
      const w = white[k];
      const weighted = w * loop;
      const seen = impedance2[k] * both;
      voltageWhite += weighted;
      voltageFlicker += flicker[k] * loop;
      feedback += ambientPower[k] * weighted;
      source += w * sourcePower[k] * both;
      currentWhite += w * seen;
      currentFlicker += flicker[k] * seen;
      bias += w * ambientPower[k] * seen;
    }
    const gain2 = gain * gain;
    const parallel2 = gain2 * parallel * parallel;
    out[INTEGRAL.source] = gain2 * source;
    out[INTEGRAL.voltageWhite] = gain2 * voltageWhite;
    out[INTEGRAL.voltageFlicker] = gain2 * voltageFlicker;
    out[INTEGRAL.currentSourceWhite] = gain2 * currentWhite;
    out[INTEGRAL.currentSourceFlicker] = gain2 * currentFlicker;
    out[INTEGRAL.currentFeedbackWhite] = parallel2 * voltageWhite;
    out[INTEGRAL.currentFeedbackFlicker] = parallel2 * voltageFlicker;
    out[INTEGRAL.feedback] = gain2 * parallel * feedback;
    out[INTEGRAL.bias] = gain2 * loadConductance * bias;
    out[INTEGRAL.excess] = excess * voltageFlicker;
  };
}
