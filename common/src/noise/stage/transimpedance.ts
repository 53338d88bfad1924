import type { OperatingConditions } from '../../conditions/index.js';
import { polynomialRoots } from '../../numeric/index.js';
import { INTEGRAL, quadraticQuality, type Evaluate, type StageModel } from './model.js';
import { networkExcess } from './networkExcess.js';
import type { Nodes } from './nodes.js';

interface Circuit {
  sourceConductance: number;
  sourceCapacitance: number;
  feedbackConductance: number;
  feedbackCapacitance: number | 'auto';
  /** squared excess noise of R_f at 1 Hz as a current, A²/Hz */
  excess: number;
}

/**
 * Transimpedance stage: a current source ∥ R ∥ C at the − input. With Y_f = 1/R_f + jωC_f and
 * P = Y_f + 1/R + jω(C + C_in), the noise gain is P/Y_f, and each current's transfer is
 * 1/(Y_f + (jf/GBW)·P).
 * Source: Graeme 1996.
 */
export function transimpedanceModel({ source, stage }: OperatingConditions): StageModel {
  const feedbackResistance = stage.feedbackResistance ?? 1;
  const current = (stage.outputVoltage ?? 0) / feedbackResistance;
  const circuit: Circuit = {
    sourceConductance: 1 / source.resistance,
    sourceCapacitance: source.capacitance,
    feedbackConductance: 1 / feedbackResistance,
    feedbackCapacitance: stage.feedbackCapacitance ?? 0,
    excess: networkExcess(stage, current, 0, feedbackResistance).feedback / feedbackResistance ** 2,
  };
  return {
    compile: (nodes) => compile(nodes, circuit),
    noiseGain: (frequency, gainBandwidth, inputCapacitance) =>
      noiseGain(circuit, frequency, gainBandwidth, inputCapacitance),
    crossoverNoiseGain: (gainBandwidth, inputCapacitance) =>
      crossoverNoiseGain(circuit, gainBandwidth, inputCapacitance),
    poles: (gainBandwidth, inputCapacitance) =>
      polynomialRoots(denominator(circuit, gainBandwidth, inputCapacitance)),
    quality: (gainBandwidth, inputCapacitance) =>
      quadraticQuality(...denominator(circuit, gainBandwidth, inputCapacitance)),
    growth: (inputCapacitance) =>
      (circuit.feedbackCapacitance === 'auto' || circuit.feedbackCapacitance === 0) &&
      source.capacitance + inputCapacitance > 0
        ? 2
        : 0,
    canNotch: false,
    spotIsQuadratic: true,
    resistive: source.capacitance === 0 && !isCapacitive(circuit.feedbackCapacitance),
    networkResistance: feedbackResistance,
  };
}

/**
 * Feedback capacitance for a maximally flat response, √(C/(π·R_f·GBW)).
 *
 * @param capacitance F, the whole at the − input
 * @param feedbackResistance Ω
 * @param gainBandwidth Hz; Infinity gives 0
 * @returns F
 * Source: Graeme 1996.
 */
export function flatFeedbackCapacitance(
  capacitance: number,
  feedbackResistance: number,
  gainBandwidth: number,
): number {
  return Math.sqrt(capacitance / (Math.PI * feedbackResistance * gainBandwidth));
}

function isCapacitive(feedbackCapacitance: number | 'auto'): boolean {
  return feedbackCapacitance !== 'auto' && feedbackCapacitance > 0;
}

function totals(circuit: Circuit, gainBandwidth: number, inputCapacitance: number) {
  const capacitance = circuit.sourceCapacitance + inputCapacitance;
  const feedback =
    circuit.feedbackCapacitance === 'auto'
      ? flatFeedbackCapacitance(capacitance, 1 / circuit.feedbackConductance, gainBandwidth)
      : circuit.feedbackCapacitance;
  return { conductance: circuit.sourceConductance + circuit.feedbackConductance, capacitance, feedback };
}

/** Y_f + (s/Ω)·P in powers of s, with Ω = 2π·GBW. */
function denominator(
  circuit: Circuit,
  gainBandwidth: number,
  inputCapacitance: number,
): [number, number, number] {
  const { conductance, capacitance, feedback } = totals(circuit, gainBandwidth, inputCapacitance);
  const unity = 2 * Math.PI * gainBandwidth;
  return [circuit.feedbackConductance, feedback + conductance / unity, (feedback + capacitance) / unity];
}

function noiseGain(
  circuit: Circuit,
  frequency: number,
  gainBandwidth: number,
  inputCapacitance: number,
): number {
  const { conductance, capacitance, feedback } = totals(circuit, gainBandwidth, inputCapacitance);
  const angular = 2 * Math.PI * frequency;
  return (
    Math.hypot(conductance, angular * (feedback + capacitance)) /
    Math.hypot(circuit.feedbackConductance, angular * feedback)
  );
}

/** With C_f: (C + C_f)/C_f; without: where the rising noise gain meets the falling open-loop gain. */
function crossoverNoiseGain(circuit: Circuit, gainBandwidth: number, inputCapacitance: number): number {
  const { conductance, capacitance, feedback } = totals(circuit, gainBandwidth, inputCapacitance);
  const resistive = conductance / circuit.feedbackConductance;
  if (feedback > 0) return (capacitance + feedback) / feedback;
  const rising = (2 * Math.PI * capacitance) / circuit.feedbackConductance;
  return Number.isFinite(gainBandwidth) ? Math.max(resistive, Math.sqrt(gainBandwidth * rising)) : Infinity;
}

function compile(nodes: Nodes, circuit: Circuit): Evaluate {
  const { count, angular, frequency, white, flicker, sourcePower, ambientPower } = nodes;
  const { feedbackConductance } = circuit;
  return (gainBandwidth, inputCapacitance, out) => {
    const { conductance, capacitance, feedback } = totals(circuit, gainBandwidth, inputCapacitance);
    const whole = capacitance + feedback;
    let source = 0;
    let voltageWhite = 0;
    let voltageFlicker = 0;
    let currentWhite = 0;
    let currentFlicker = 0;
    let thermal = 0;
    for (let k = 0; k < count; k++) {
      const susceptance = angular[k] * whole;
      const slowness = frequency[k] / gainBandwidth;
      const re = feedbackConductance - slowness * susceptance;
      const im = angular[k] * feedback + slowness * conductance;
      const loop = 1 / (re * re + im * im);
      const voltage = (conductance * conductance + susceptance * susceptance) * loop;
      const weighted = white[k] * loop;
      source += sourcePower[k] * weighted;
      thermal += ambientPower[k] * weighted;
      voltageWhite += white[k] * voltage;
      voltageFlicker += flicker[k] * voltage;
      currentWhite += weighted;
      currentFlicker += flicker[k] * loop;
    }
    out[INTEGRAL.source] = source;
    out[INTEGRAL.voltageWhite] = voltageWhite;
    out[INTEGRAL.voltageFlicker] = voltageFlicker;
    out[INTEGRAL.currentSourceWhite] = 0;
    out[INTEGRAL.currentSourceFlicker] = 0;
    out[INTEGRAL.currentFeedbackWhite] = currentWhite;
    out[INTEGRAL.currentFeedbackFlicker] = currentFlicker;
    out[INTEGRAL.feedback] = feedbackConductance * thermal;
    out[INTEGRAL.bias] = 0;
    out[INTEGRAL.excess] = circuit.excess * currentFlicker;
  };
}
