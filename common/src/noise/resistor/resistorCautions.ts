import type { Resistor } from '../../parts/index.js';
import type { ResistorConditions } from '../../conditions/index.js';

/** What makes a resistor's figures less certain than they look, or its place one to think about. */
export const RESISTOR_CAUTIONS = [
  'noise-index-unknown',
  'rating-unknown',
  'near-rating',
  'self-heating-unknown',
] as const;
export type ResistorCaution = (typeof RESISTOR_CAUTIONS)[number];

export const RESISTOR_CAUTION_LABELS: Record<ResistorCaution, string> = {
  'noise-index-unknown': 'noise index unknown',
  'rating-unknown': 'power rating unknown',
  'near-rating': 'over half its rating',
  'self-heating-unknown': 'self-heating unknown',
};

export const RESISTOR_CAUTION_DETAILS: Record<ResistorCaution, string> = {
  'noise-index-unknown':
    'The noise index is unknown: the excess noise that the direct voltage makes is not in the total.',
  'rating-unknown': 'The power rating is unknown: check it against the dissipation.',
  'near-rating':
    'The dissipation is over half of the rating: allow for derating at the temperature of the place.',
  'self-heating-unknown':
    'The temperature rise at rated power is unknown: the thermal noise counts at the ambient temperature.',
};

/** Below this share of the rating a resistor heats itself too little to matter. */
const NOTICEABLE_LOAD = 0.05;
const NEAR_RATING = 0.5;

/**
 * The cautions that apply to a resistor at its place, in the order of `RESISTOR_CAUTIONS`.
 *
 * @param dissipation W, that of the place
 */
export function resistorCautions(
  { dcVoltage }: ResistorConditions,
  { noiseIndex, powerRating, temperatureRise }: Resistor,
  dissipation: number,
): ResistorCaution[] {
  const load = powerRating === null ? Infinity : dissipation / powerRating;
  const applies: Record<ResistorCaution, boolean> = {
    'noise-index-unknown': noiseIndex === null && dcVoltage !== 0,
    'rating-unknown': powerRating === null && dcVoltage !== 0,
    'near-rating': powerRating !== null && load > NEAR_RATING,
    'self-heating-unknown': temperatureRise === null && dcVoltage !== 0 && load > NOTICEABLE_LOAD,
  };
  return RESISTOR_CAUTIONS.filter((caution) => applies[caution]);
}
