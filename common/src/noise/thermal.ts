import { BOLTZMANN, PLANCK } from './constants.js';

/**
 * Planck's factor Q = x/(eˣ − 1) with x = hf/(kT): how much less than kT a mode holds.
 *
 * @param frequency Hz, ≥ 0
 * @param temperature K, > 0
 * @returns a number from 0 to 1; 1 in the classical limit hf ≪ kT, accurate to 1e-15
 * Source: Nyquist 1928, equation for high frequencies; Planck 1901.
 */
export function planckFactor(frequency: number, temperature: number): number {
  const x = (PLANCK * frequency) / (BOLTZMANN * temperature);
  if (x === 0) return 1;
  return x > 700 ? 0 : x / Math.expm1(x);
}

/**
 * Power density of thermal noise 4·k·T·Q(f, T) per ohm: times R it is the square of the voltage density
 * of a resistor in V²/Hz, times 1/R that of its current density in A²/Hz.
 *
 * @param temperature K, > 0
 * @param frequency Hz, ≥ 0; left out = classical (Q = 1)
 * @returns W/Hz times 4
 * Source: Johnson 1928, Nyquist 1928.
 */
export function thermalPowerDensity(temperature: number, frequency = 0): number {
  return 4 * BOLTZMANN * temperature * planckFactor(frequency, temperature);
}

/**
 * Thermal noise density of a resistor √(4·k·T·R·Q) in V/√Hz.
 *
 * @param resistance Ω, ≥ 0
 * @param temperature K, > 0
 * @param frequency Hz, ≥ 0; left out = classical
 * Source: Johnson 1928, Nyquist 1928.
 * @example thermalVoltageDensity(1000, 290) // 4.002e-9
 */
export function thermalVoltageDensity(resistance: number, temperature: number, frequency = 0): number {
  return Math.sqrt(thermalPowerDensity(temperature, frequency) * resistance);
}
