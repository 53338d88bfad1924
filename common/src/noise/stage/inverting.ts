import type { OperatingConditions } from '../../conditions/index.js';
import { polynomialRoots, type Complex } from '../../numeric/index.js';
import { INTEGRAL, quadraticQuality, type Evaluate, type StageModel } from './model.js';
import { networkExcess, type NetworkExcess } from './networkExcess.js';
import type { Nodes } from './nodes.js';

interface Circuit {
  resistance: number;
  inductance: number;
  capacitance: number;
  gainResistance: number;
  biasResistance: number;
  feedbackResistance: number;
  excess: NetworkExcess;
}

/**
 * Inverting stage. The source's Thevenin impedance Z/(1 + jωCZ), Z = R + jωL, in series with R_g makes Z_in;
 * noise gain N = 1 + R_f/Z_in + jωC_in·R_f; each transfer is divided by 1 + jf·N/GBW.
 * Source: Motchenbacher & Connelly 1993.
 */
export function invertingModel({ source, stage }: OperatingConditions): StageModel {
  const gainResistance = stage.gainResistance ?? 0;
  const gain = stage.gain ?? 1;
  const feedbackResistance = gain * (source.resistance + gainResistance);
  const current = (stage.outputVoltage ?? 0) / feedbackResistance;
  const circuit: Circuit = {
    ...source,
    gainResistance,
    biasResistance: stage.biasResistance ?? 0,
    feedbackResistance,
    excess: networkExcess(stage, current, gainResistance, feedbackResistance),
  };
  const noiseGain = (frequency: number, inputCapacitance: number) => {
    const { re, im } = networkGain(circuit, 2 * Math.PI * frequency);
    return Math.hypot(re, im + 2 * Math.PI * frequency * circuit.feedbackResistance * inputCapacitance);
  };
  return {
    compile: (nodes) => compile(nodes, circuit),
    noiseGain: (frequency, _gainBandwidth, inputCapacitance) => noiseGain(frequency, inputCapacitance),
    crossoverNoiseGain: () => 1 + gain,
    poles: (gainBandwidth, inputCapacitance) => poles(circuit, gainBandwidth, inputCapacitance),
    quality: (gainBandwidth, inputCapacitance) => quality(circuit, gainBandwidth, inputCapacitance),
    growth: (inputCapacitance) => (inputCapacitance > 0 ? 2 : 0),
    canNotch: source.inductance > 0,
    spotIsQuadratic: true,
    resistive: source.inductance === 0 && source.capacitance === 0,
    networkResistance: circuit.feedbackResistance,
  };
}

/** 1 + R_f/Z_in, with R_f/Z_in = R_f·(1 + jωCZ)/(Z + R_g·(1 + jωCZ)). */
function networkGain(
  circuit: Circuit,
  angular: number,
): { re: number; im: number; ratio2: number; divider2: number } {
  const { resistance, inductance, capacitance, gainResistance, feedbackResistance } = circuit;
  const dividerRe = 1 - angular * angular * inductance * capacitance;
  const dividerIm = angular * resistance * capacitance;
  const seriesRe = resistance + gainResistance * dividerRe;
  const seriesIm = angular * inductance + gainResistance * dividerIm;
  const series2 = seriesRe * seriesRe + seriesIm * seriesIm;
  const divider2 = dividerRe * dividerRe + dividerIm * dividerIm;
  return {
    re: 1 + (feedbackResistance * (dividerRe * seriesRe + dividerIm * seriesIm)) / series2,
    im: (feedbackResistance * (dividerIm * seriesRe - dividerRe * seriesIm)) / series2,
    ratio2: (feedbackResistance * feedbackResistance) / series2,
    divider2,
  };
}

/** S + (s/Ω)·(S·(1 + s·C_in·R_f) + R_f·P) and S in powers of s: S = Z + R_g·P, P = 1 + sCZ, Ω = 2π·GBW. */
function denominators(circuit: Circuit, gainBandwidth: number, inputCapacitance: number): number[][] {
  const {
    resistance: r,
    inductance: l,
    capacitance: c,
    gainResistance: rg,
    feedbackResistance: rf,
  } = circuit;
  const divider = [1, r * c, l * c];
  const series = [r + rg, l + rg * divider[1], rg * divider[2]];
  const unity = 2 * Math.PI * gainBandwidth;
  const delay = inputCapacitance * rf;
  const closedLoop = [0, 1, 2, 3, 4].map(
    (k) =>
      (series[k] ?? 0) +
      ((series[k - 1] ?? 0) + delay * (series[k - 2] ?? 0) + rf * (divider[k - 1] ?? 0)) / unity,
  );
  return [series, closedLoop];
}

function poles(circuit: Circuit, gainBandwidth: number, inputCapacitance: number): Complex[] {
  return denominators(circuit, gainBandwidth, inputCapacitance).flatMap(polynomialRoots);
}

function quality(circuit: Circuit, gainBandwidth: number, inputCapacitance: number): number {
  const { resistance, gainResistance, feedbackResistance, inductance, capacitance } = circuit;
  if (inductance === 0 && capacitance === 0) {
    const unity = 2 * Math.PI * gainBandwidth;
    const gain = 1 + feedbackResistance / (resistance + gainResistance);
    return quadraticQuality(1, gain / unity, (inputCapacitance * feedbackResistance) / unity);
  }
  const sharpest = Math.max(
    ...poles(circuit, gainBandwidth, inputCapacitance).map(({ re, im }) => Math.hypot(re, im) / Math.abs(re)),
  );
  return sharpest === 1 ? 0 : sharpest / 2;
}

function compile(nodes: Nodes, circuit: Circuit): Evaluate {
  const { gainResistance, biasResistance, feedbackResistance, excess } = circuit;
  const { count, angular, frequency, white, flicker, sourcePower, ambientPower } = nodes;
  const real = new Float64Array(count);
  const imaginary = new Float64Array(count);
  const sourceWeight = new Float64Array(count);
  const gainWeight = new Float64Array(count);
  const excessWeight = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    const { re, im, ratio2, divider2 } = networkGain(circuit, angular[k]);
    real[k] = re;
    imaginary[k] = im;
    sourceWeight[k] = white[k] * sourcePower[k] * ratio2;
    excessWeight[k] = flicker[k] * (excess.feedback + excess.gain * ratio2 * divider2);
    gainWeight[k] = white[k] * ambientPower[k] * (feedbackResistance + gainResistance * ratio2 * divider2);
  }
  return (gainBandwidth, inputCapacitance, out) => {
    const delay = inputCapacitance * feedbackResistance;
    let source = 0;
    let voltageWhite = 0;
    let voltageFlicker = 0;
    let loopWhite = 0;
    let loopFlicker = 0;
    let feedback = 0;
    let bias = 0;
    let excessPower = 0;
    for (let k = 0; k < count; k++) {
      const re = real[k];
      const im = imaginary[k] + angular[k] * delay;
      const slowness = frequency[k] / gainBandwidth;
      const loopRe = 1 - slowness * im;
      const loopIm = slowness * re;
      const loop = 1 / (loopRe * loopRe + loopIm * loopIm);
      const voltage = (re * re + im * im) * loop;
      const w = white[k];
      source += sourceWeight[k] * loop;
      feedback += gainWeight[k] * loop;
      excessPower += excessWeight[k] * loop;
      voltageWhite += w * voltage;
      voltageFlicker += flicker[k] * voltage;
      loopWhite += w * loop;
      loopFlicker += flicker[k] * loop;
      bias += w * ambientPower[k] * voltage;
    }
    const feedback2 = feedbackResistance * feedbackResistance;
    const bias2 = biasResistance * biasResistance;
    out[INTEGRAL.source] = source;
    out[INTEGRAL.voltageWhite] = voltageWhite;
    out[INTEGRAL.voltageFlicker] = voltageFlicker;
    out[INTEGRAL.currentSourceWhite] = bias2 * voltageWhite;
    out[INTEGRAL.currentSourceFlicker] = bias2 * voltageFlicker;
    out[INTEGRAL.currentFeedbackWhite] = feedback2 * loopWhite;
    out[INTEGRAL.currentFeedbackFlicker] = feedback2 * loopFlicker;
    out[INTEGRAL.feedback] = feedback;
    out[INTEGRAL.bias] = biasResistance * bias;
    out[INTEGRAL.excess] = excessPower;
  };
}
