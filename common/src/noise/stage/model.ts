import type { Complex } from '../../numeric/index.js';
import type { Nodes } from './nodes.js';

/** Where each integral stands in the array that a stage fills: powers at the output, V² per unit of the generator. */
export const INTEGRAL = {
  /** the source's own noise, V² */
  source: 0,
  /** of e_n², white and 1/f part */
  voltageWhite: 1,
  voltageFlicker: 2,
  /** of i_n² at the + input, Ω² */
  currentSourceWhite: 3,
  currentSourceFlicker: 4,
  /** of i_n² at the − input, Ω² */
  currentFeedbackWhite: 5,
  currentFeedbackFlicker: 6,
  /** thermal noise of the feedback network, V² */
  feedback: 7,
  /** thermal noise of load or bias resistor, V² */
  bias: 8,
  /** excess noise of the feedback network, V² */
  excess: 9,
} as const;

export const INTEGRALS = 10;

/** Sums a stage's integrals over nodes for one amplifier: `out` receives INTEGRALS numbers. */
export type Evaluate = (gainBandwidth: number, inputCapacitance: number, out: Float64Array) => void;

/** A topology at given conditions: the transfer of every generator to the output. */
export interface StageModel {
  /** Prepares the nodes once for all amplifiers. GBW in Hz, Infinity = ideal; capacitance in F. */
  compile(nodes: Nodes): Evaluate;
  /** |noise gain| of an amplifier at a frequency in Hz. */
  noiseGain(frequency: number, gainBandwidth: number, inputCapacitance: number): number;
  /** Noise gain where the loop gain falls to one, against which the minimum stable gain is held. */
  crossoverNoiseGain(gainBandwidth: number, inputCapacitance: number): number;
  /** Poles of the transfers in rad/s, in the left half plane, both of each pair. */
  poles(gainBandwidth: number, inputCapacitance: number): Complex[];
  /** Quality factor of the amplifier's sharpest resonance: above ½ its poles are off the real axis. */
  quality(gainBandwidth: number, inputCapacitance: number): number;
  /** By how many powers of f the densities grow towards infinity with an ideal amplifier: 0 or 2. */
  growth(inputCapacitance: number): 0 | 2;
  /**
   * An amplifier's input capacitance can tune a notch of the noise gain into the band, so that the sums over
   * the band may dip between amplifiers that are near neighbours.
   */
  canNotch: boolean;
  /**
   * A spot density, referred to the source, is least with an infinite gain–bandwidth product, and then a quadratic
   * function of the input capacitance.
   */
  spotIsQuadratic: boolean;
  /** Nothing depends on frequency with an ideal amplifier without input capacitance. */
  resistive: boolean;
  /** Ω that the feedback network puts on the output, Infinity where there is none. */
  networkResistance: number;
}

/** Quality factor of c₀ + c₁s + c₂s², √(c₀c₂)/c₁; 0 where there is no second-order term. */
export function quadraticQuality(c0: number, c1: number, c2: number): number {
  return c2 === 0 ? 0 : Math.sqrt(c0 * c2) / c1;
}
