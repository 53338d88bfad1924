import type { QuantityKind } from './kinds.js';

/** How a kind's values are written: with an SI prefix, as they stand, in °C or K, in percent, in ppm/K, or in decibels. */
export type QuantityStyle = 'prefixed' | 'plain' | 'temperature' | 'percent' | 'perMillion' | 'decibel';

/** The unit in which a temperature coefficient is written. */
export const PER_MILLION = 'ppm/K';

/** What parsing, formatting and their messages know of a kind of quantity. */
export interface Quantity {
  /** The SI unit of the stored value; empty for a pure number. */
  unit: string;
  /** The kind in words, such as `voltage noise density`. */
  label: string;
  /** The label with its article, for messages. */
  noun: string;
  /** What one may type. */
  example: string;
  /** Another way to type it. */
  alternative?: string;
  style: QuantityStyle;
  /** Letters that may stand in place of the decimal mark, as in `4k7` (IEC 60062). */
  codeLetters: string;
}

/**
 * The sixteen kinds of quantity: SI unit, words and examples.
 * Code letters of resistance and capacitance follow IEC 60062 (R K M G T and p n µ m F); the others are common
 * practice, no source (`3V3`, `2k5`).
 */
export const QUANTITIES: Record<QuantityKind, Quantity> = {
  resistance: {
    unit: 'Ω',
    label: 'resistance',
    noun: 'a resistance',
    example: '4.7 kΩ',
    alternative: '4k7',
    style: 'prefixed',
    codeLetters: 'RmkKMGT',
  },
  capacitance: {
    unit: 'F',
    label: 'capacitance',
    noun: 'a capacitance',
    example: '100 pF',
    alternative: '4n7',
    style: 'prefixed',
    codeLetters: 'pnuµmF',
  },
  inductance: {
    unit: 'H',
    label: 'inductance',
    noun: 'an inductance',
    example: '100 mH',
    alternative: '4m7',
    style: 'prefixed',
    codeLetters: 'pnuµmH',
  },
  frequency: {
    unit: 'Hz',
    label: 'frequency',
    noun: 'a frequency',
    example: '20 kHz',
    style: 'prefixed',
    codeLetters: 'kKMGT',
  },
  temperature: {
    unit: 'K',
    label: 'temperature',
    noun: 'a temperature',
    example: '25 °C',
    alternative: '77 K (a number alone is in °C)',
    style: 'temperature',
    codeLetters: '',
  },
  temperatureDifference: {
    unit: 'K',
    label: 'temperature difference',
    noun: 'a temperature difference',
    example: '80 K',
    style: 'plain',
    codeLetters: '',
  },
  temperatureCoefficient: {
    unit: '1/K',
    label: 'temperature coefficient',
    noun: 'a temperature coefficient',
    example: '50 ppm/K',
    style: 'perMillion',
    codeLetters: '',
  },
  voltage: {
    unit: 'V',
    label: 'voltage',
    noun: 'a voltage',
    example: '2.5 V',
    alternative: '500 nV',
    style: 'prefixed',
    codeLetters: 'nuµmVkK',
  },
  current: {
    unit: 'A',
    label: 'current',
    noun: 'a current',
    example: '1.5 mA',
    alternative: '20 nA',
    style: 'prefixed',
    codeLetters: 'pnuµmA',
  },
  voltageNoiseDensity: {
    unit: 'V/√Hz',
    label: 'voltage noise density',
    noun: 'a voltage noise density',
    example: '3.3 nV/√Hz',
    style: 'prefixed',
    codeLetters: 'nuµ',
  },
  currentNoiseDensity: {
    unit: 'A/√Hz',
    label: 'current noise density',
    noun: 'a current noise density',
    example: '1.2 pA/√Hz',
    style: 'prefixed',
    codeLetters: 'fpn',
  },
  power: {
    unit: 'W',
    label: 'power',
    noun: 'a power',
    example: '250 mW',
    style: 'prefixed',
    codeLetters: 'uµmW',
  },
  gain: { unit: '', label: 'gain', noun: 'a gain', example: '100', style: 'plain', codeLetters: 'kK' },
  fraction: {
    unit: '',
    label: 'fraction',
    noun: 'a fraction',
    example: '1 %',
    alternative: '0.01',
    style: 'percent',
    codeLetters: '',
  },
  decibel: {
    unit: 'dB',
    label: 'level in decibels',
    noun: 'a level in decibels',
    example: '1.5 dB',
    style: 'decibel',
    codeLetters: '',
  },
  count: { unit: '', label: 'count', noun: 'a count', example: '4', style: 'plain', codeLetters: '' },
};
