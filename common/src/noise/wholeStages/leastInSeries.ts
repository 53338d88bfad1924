import { halfSource } from '../stage/halfSource.js';
import type { SoughtConditions } from './stageSearch.js';

/** A low-pass leaves something of the noise up to so many times its frequency. */
const BEYOND = 10;

/**
 * Ω, the least impedance that the source puts in series with R_g: over the band it is least at one of the ends.
 * The noise is a smooth function of the logarithm of both together. 0 where the source doesn't drive the network.
 */
export function leastInSeries({ source, stage, band }: SoughtConditions): number {
  if (stage.topology !== 'inverting' && stage.topology !== 'difference') return 0;
  const leg = stage.topology === 'difference' ? halfSource(source) : source;
  const { resistance, inductance, capacitance } = leg;
  const impedance = (frequency: number) => {
    const angular = 2 * Math.PI * frequency;
    const divider = Math.hypot(
      1 - angular * angular * inductance * capacitance,
      angular * resistance * capacitance,
    );
    return Math.hypot(resistance, angular * inductance) / divider;
  };
  return Math.min(impedance(band.lower), impedance(band.upper * (band.lowPassOrder === 0 ? 1 : BEYOND)));
}
