import type { Amplifier } from './amplifier.js';
import type { FieldError } from './fieldError.js';

/**
 * What is wrong between the figures of an op-amp, each of which is within its own bounds: limits that
 * contradict each other. Unknown figures (`null`) contradict nothing. Empty = the part can be kept.
 */
export function checkOpAmp(part: { amplifier: Amplifier }): FieldError[] {
  const { supplyMinimum, supplyMaximum } = part.amplifier;
  if (supplyMinimum === null || supplyMaximum === null || supplyMinimum <= supplyMaximum) return [];
  return [
    {
      field: 'amplifier.supplyMaximum',
      message: 'supply maximum: a voltage not below the supply minimum was expected',
    },
  ];
}
