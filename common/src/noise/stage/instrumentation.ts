import { USUAL_DIFFERENCE_RESISTANCE, type OperatingConditions } from '../../conditions/index.js';
import { polynomialRoots } from '../../numeric/index.js';
import { dividerGrowth, dividerNodes, dividerPowers, type InputCircuit } from './divider.js';
import { halfSource } from './halfSource.js';
import { INTEGRAL, quadraticQuality, type Evaluate, type StageModel } from './model.js';
import { networkExcess } from './networkExcess.js';
import type { Nodes } from './nodes.js';

/** One leg of the source, and what follows it. */
interface Circuit extends InputCircuit {
  gain: number;
  /** Ω, R_f of each input amplifier */
  feedbackResistance: number;
  differenceResistance: number;
  /** squared excess noise of R_g and both R_f between the input amplifiers' outputs at 1 Hz, V²/Hz */
  excess: number;
}

type Quadratic = [number, number, number];

/**
 * Instrumentation stage of three op-amps of one type. Each leg of the source, Z = (R + jωL)/2 with 2C, drives
 * the + input of an input amplifier; R_g lies between their − inputs, R_f = R_g·(gain − 1)/2 feeds each back; at
 * gain 1 they are followers. Four equal resistors R_d and the third op-amp take the difference with gain 1. C_in
 * lies from each input of each op-amp to ground.
 *
 * D = 1 + Z·(jω(2C + C_in) + 1/R_L) divides the source's voltage. The input pair has the noise gain
 * N₁ = gain + jωC_in·R_f, the third op-amp N₂ = 2 + jωC_in·R_d; what is common to both input amplifiers ends in the
 * difference, so that between their outputs each transfer is that of half the circuit, R_g/2 to ground.
 *
 * By contributor: `amplifierVoltage` holds e_n of all three, `amplifierCurrentSource` i_n of the two + inputs at
 * the source, `amplifierCurrentFeedback` i_n of both − inputs and of both inputs of the third, `feedback` R_g, both
 * R_f and four R_d, `bias` both load resistors, `excess` R_g and both R_f (R_d counts without).
 *
 * Source: Motchenbacher & Connelly 1993 for each amplifier; the rest by symmetry.
 */
export function instrumentationModel({ source, stage }: OperatingConditions): StageModel {
  const { gain = 1, loadResistance, differenceResistance = USUAL_DIFFERENCE_RESISTANCE } = stage;
  const gainResistance = gain > 1 ? (stage.gainResistance ?? 0) : 0;
  const feedbackResistance = (gainResistance * (gain - 1)) / 2;
  const current = gainResistance === 0 ? 0 : (stage.outputVoltage ?? 0) / (gain * gainResistance);
  const ofNetwork = networkExcess(stage, current, gainResistance, feedbackResistance);
  const circuit: Circuit = {
    ...halfSource(source),
    loadConductance: loadResistance === undefined ? 0 : 1 / loadResistance,
    gain,
    feedbackResistance,
    differenceResistance,
    excess: 2 * ofNetwork.feedback + ofNetwork.gain * (gain - 1) ** 2,
  };
  return {
    compile: (nodes) => compile(nodes, circuit),
    noiseGain: (frequency, _gainBandwidth, inputCapacitance) =>
      slowerNoiseGain(circuit, 2 * Math.PI * frequency * inputCapacitance),
    crossoverNoiseGain: () => Math.min(gain, 2),
    poles: (gainBandwidth, inputCapacitance) =>
      denominators(circuit, gainBandwidth, inputCapacitance).flatMap(polynomialRoots),
    quality: (gainBandwidth, inputCapacitance) =>
      Math.max(
        ...denominators(circuit, gainBandwidth, inputCapacitance).map((powers) =>
          quadraticQuality(...powers),
        ),
      ),
    growth: (inputCapacitance) => (inputCapacitance > 0 ? 2 : dividerGrowth(circuit, inputCapacitance)),
    canNotch: false,
    spotIsQuadratic: false,
    resistive: source.inductance === 0 && source.capacitance === 0,
    networkResistance: Math.min(
      gainResistance > 0 ? feedbackResistance + gainResistance / 2 : Infinity,
      differenceResistance,
    ),
  };
}

/** |noise gain| of the loop with the larger one, which is the slower. */
function slowerNoiseGain({ gain, feedbackResistance, differenceResistance }: Circuit, susceptance: number) {
  return Math.max(
    Math.hypot(gain, susceptance * feedbackResistance),
    Math.hypot(2, susceptance * differenceResistance),
  );
}

/** In powers of s, with Ω = 2π·GBW: D, 1 + (s/Ω)·N₁ and 1 + (s/Ω)·N₂. */
function denominators(circuit: Circuit, gainBandwidth: number, inputCapacitance: number): Quadratic[] {
  const unity = 2 * Math.PI * gainBandwidth;
  const loop = (noiseGain: number, feedback: number): Quadratic => [
    1,
    noiseGain / unity,
    (inputCapacitance * feedback) / unity,
  ];
  return [
    dividerPowers(circuit, inputCapacitance),
    loop(circuit.gain, circuit.feedbackResistance),
    loop(2, circuit.differenceResistance),
  ];
}

function compile(nodes: Nodes, circuit: Circuit): Evaluate {
  const { gain } = circuit;
  const { count, angular, frequency, white, flicker, sourcePower, ambientPower } = nodes;
  const { real, imaginary, realPerFarad, imaginaryPerFarad, impedance2 } = dividerNodes(nodes, circuit);
  return (gainBandwidth, inputCapacitance, out) => {
    const pairDelay = inputCapacitance * circuit.feedbackResistance;
    const thirdDelay = inputCapacitance * circuit.differenceResistance;
    const sums = emptySums();
    for (let k = 0; k < count; k++) {
      const re = real[k] + realPerFarad[k] * inputCapacitance;
      const im = imaginary[k] + imaginaryPerFarad[k] * inputCapacitance;
      const slowness = frequency[k] / gainBandwidth;
      const third2 = 4 + (angular[k] * thirdDelay) ** 2;
      const pair2 = gain * gain + (angular[k] * pairDelay) ** 2;
      const third = 1 / ((1 - slowness * angular[k] * thirdDelay) ** 2 + 4 * slowness * slowness);
      const pair = third / ((1 - slowness * angular[k] * pairDelay) ** 2 + (slowness * gain) ** 2);
      const input = (pair * pair2) / (re * re + im * im);
      const seen = impedance2[k] * input;
      const w = white[k];
      const voltage = 2 * pair * pair2 + third * third2;
      sums.source += w * sourcePower[k] * input;
      sums.voltageWhite += w * voltage;
      sums.voltageFlicker += flicker[k] * voltage;
      sums.seenWhite += w * seen;
      sums.seenFlicker += flicker[k] * seen;
      sums.bias += w * ambientPower[k] * seen;
      sums.pairWhite += w * pair;
      sums.pairFlicker += flicker[k] * pair;
      sums.pairThermal += w * ambientPower[k] * pair;
      sums.thirdWhite += w * third;
      sums.thirdFlicker += flicker[k] * third;
      sums.thirdThermal += w * ambientPower[k] * third;
    }
    fill(out, sums, circuit);
  };
}

/** `pair` and `third` are sums of the power transfer from the pair's outputs, and from the third op-amp on. */
function emptySums() {
  return {
    source: 0,
    voltageWhite: 0,
    voltageFlicker: 0,
    seenWhite: 0,
    seenFlicker: 0,
    bias: 0,
    pairWhite: 0,
    pairFlicker: 0,
    pairThermal: 0,
    thirdWhite: 0,
    thirdFlicker: 0,
    thirdThermal: 0,
  };
}

/** R_g and both R_f make 4kT·(R_g·(gain − 1)² + 2R_f) = 4kT·2R_f·gain between the pair's outputs. */
function fill(out: Float64Array, sums: ReturnType<typeof emptySums>, circuit: Circuit): void {
  const { gain, loadConductance, feedbackResistance, differenceResistance, excess } = circuit;
  const feedback2 = 2 * feedbackResistance * feedbackResistance;
  const difference2 = 2 * differenceResistance * differenceResistance;
  out[INTEGRAL.source] = sums.source;
  out[INTEGRAL.voltageWhite] = sums.voltageWhite;
  out[INTEGRAL.voltageFlicker] = sums.voltageFlicker;
  out[INTEGRAL.currentSourceWhite] = 2 * sums.seenWhite;
  out[INTEGRAL.currentSourceFlicker] = 2 * sums.seenFlicker;
  out[INTEGRAL.currentFeedbackWhite] = feedback2 * sums.pairWhite + difference2 * sums.thirdWhite;
  out[INTEGRAL.currentFeedbackFlicker] = feedback2 * sums.pairFlicker + difference2 * sums.thirdFlicker;
  out[INTEGRAL.feedback] =
    2 * feedbackResistance * gain * sums.pairThermal + 4 * differenceResistance * sums.thirdThermal;
  out[INTEGRAL.bias] = 2 * loadConductance * sums.bias;
  out[INTEGRAL.excess] = excess * sums.pairFlicker;
}
