import { RESISTOR_CAUTION_DETAILS, type ResistorCaution } from '@roothertz/common/noise';
import type { Resistor, ResistorParameterKey } from '@roothertz/common/parts';

const MISSING: readonly [ResistorParameterKey, ResistorCaution][] = [
  ['noiseIndex', 'noise-index-unknown'],
  ['powerRating', 'rating-unknown'],
  ['temperatureRise', 'self-heating-unknown'],
];

/** What the resistor's unknown figures mean for a ranking, in words. */
export function resistorCautions(resistor: Resistor): string[] {
  return MISSING.filter(([key]) => resistor[key] === null).map(
    ([, caution]) => RESISTOR_CAUTION_DETAILS[caution],
  );
}
