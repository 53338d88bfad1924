import type { OperatingConditions } from '../conditions/index.js';
import { shotPowerDensity } from './shot.js';
import { thermalPowerDensity } from './thermal.js';

/** The source's own temperature in K: the ambient one where it isn't stated. */
export function sourceTemperature({ source, ambientTemperature }: OperatingConditions): number {
  return source.temperature ?? ambientTemperature;
}

/**
 * Density of the source's noise: 4kT·R·Q in V²/Hz in series with its resistance; in a transimpedance stage
 * 4kT·Q/R + 2·q·I in A²/Hz, the shot noise of the detector's direct current included.
 *
 * @param temperature K, at which the source's resistance counts
 * @param frequency Hz
 * Source: Nyquist 1928, Schottky 1918.
 */
export function sourcePowerDensity(
  { source, stage }: OperatingConditions,
  temperature: number,
  frequency: number,
): number {
  const thermal = thermalPowerDensity(temperature, frequency);
  if (stage.topology !== 'transimpedance') return thermal * source.resistance;
  return thermal / source.resistance + shotPowerDensity(source.directCurrent ?? 0);
}
