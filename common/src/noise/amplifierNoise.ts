import type { AmplifierTemperatureModel } from '../conditions/index.js';
import type { Amplifier, InputType } from '../parts/index.js';
import { PARAMETER_TEMPERATURE } from './constants.js';
import { shotPowerDensity } from './shot.js';

/** What the noise model needs of an amplifier; every other parameter may be left out. */
export type NoiseAmplifier = Pick<Amplifier, 'voltageNoise'> & Partial<Omit<Amplifier, 'voltageNoise'>>;

/**
 * The factors by which e_n² and i_n² at 25 °C are multiplied at another temperature.
 *
 * Model `estimated`: e_n² goes with the absolute temperature; i_n of JFET and CMOS inputs doubles per
 * 20 K, since their gate leakage doubles per 10 K and shot noise is its square root; i_n of bipolar,
 * zero-drift and unknown inputs stays. Model `none`: both factors are 1.
 *
 * @param temperature ambient, K
 * Source: common practice, none published.
 */
export function temperatureFactors(
  model: AmplifierTemperatureModel,
  temperature: number,
  inputType: InputType | null,
): { voltage: number; current: number } {
  if (model === 'none') return { voltage: 1, current: 1 };
  const leaks = inputType === 'jfet' || inputType === 'cmos';
  return {
    voltage: temperature / PARAMETER_TEMPERATURE,
    current: leaks ? 4 ** ((temperature - PARAMETER_TEMPERATURE) / 20) : 1,
  };
}

/** The least current noise that inputs of each type are made with, in A/√Hz (common practice, no source). */
const LEAST_CURRENT_NOISE: Record<InputType, number> = {
  bipolar: 1e-13,
  jfet: 3e-16,
  cmos: 1e-16,
  'zero-drift': 3e-15,
};

/**
 * The current noise that stands in for an unknown one: the shot noise √(2·q·I_b) of the input bias
 * current where that is known, else the least that the input type is made with, else 0. The truth isn't
 * below it, so a total made with it is a lower bound.
 *
 * @param inputBiasCurrent A, or null
 * @returns A/√Hz
 * Source: Schottky 1918 for the shot noise; the rest is common practice.
 */
export function leastCurrentNoise(inputType: InputType | null, inputBiasCurrent: number | null): number {
  if (inputBiasCurrent !== null) return Math.sqrt(shotPowerDensity(inputBiasCurrent));
  return inputType === null ? 0 : LEAST_CURRENT_NOISE[inputType];
}
