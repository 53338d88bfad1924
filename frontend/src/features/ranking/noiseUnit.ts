import type { Topology } from '@roothertz/common/conditions';
import { formatQuantity, splitQuantity, toDisplayUnit, type QuantityKind } from '@roothertz/common/units';

/** What a stage's noise is referred to the source as: a voltage, in a transimpedance stage a current. */
export function noiseKind(topology: Topology): 'voltage' | 'current' {
  return topology === 'transimpedance' ? 'current' : 'voltage';
}

export function densityKind(topology: Topology): 'voltageNoiseDensity' | 'currentNoiseDensity' {
  return topology === 'transimpedance' ? 'currentNoiseDensity' : 'voltageNoiseDensity';
}

/** `67.8 nV rms` */
export function rmsText(value: number, topology: Topology): string {
  return `${formatQuantity(value, noiseKind(topology))} rms`;
}

/** The one unit in which a column of values stands: that of its smallest value. */
export function commonUnit(smallest: number, kind: QuantityKind): string {
  return splitQuantity(smallest, kind).unit;
}

/** A value in a column's unit: three significant digits, none before the mark rounded away. */
export function inUnit(value: number, unit: string): string {
  const shown = toDisplayUnit(value, unit);
  return formatQuantity(shown, 'gain', { digits: 3 }) === '0' ? '0' : padded(shown);
}

function padded(shown: number): string {
  if (shown >= 99.95) return formatQuantity(shown, 'count', { digits: 3 });
  return shown.toPrecision(3);
}
