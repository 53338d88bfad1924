import type { QuantityField } from '../parts/index.js';
import { CONDITION_FIELDS } from './conditionFields.js';

/** Every numeric field of a resistor's place by its path, as `CONDITION_FIELDS` is for a stage. */
export const RESISTOR_CONDITION_FIELDS = {
  'conditions.resistance': {
    label: 'resistance',
    symbol: 'R',
    kind: 'resistance',
    bounds: { from: 1e-9, to: 1e13 },
    help: 'The value that the place asks for.',
  },
  'conditions.resistanceTolerance': {
    label: 'value window',
    kind: 'fraction',
    bounds: { from: 0, to: 0.5 },
    help: 'How far a part’s nominal value may lie from the value asked for.',
  },
  'conditions.dcVoltage': {
    label: 'direct voltage',
    symbol: 'V',
    kind: 'voltage',
    bounds: { from: -1e6, to: 1e6 },
    help: 'Direct voltage across the resistor: it makes excess noise and heat; 0 = none.',
  },
  'conditions.ambientTemperature': {
    ...CONDITION_FIELDS['conditions.ambientTemperature'],
    help: 'Temperature around the resistor.',
  },
  'conditions.band.lower': CONDITION_FIELDS['conditions.band.lower'],
  'conditions.band.upper': CONDITION_FIELDS['conditions.band.upper'],
  'conditions.band.lowPassOrder': CONDITION_FIELDS['conditions.band.lowPassOrder'],
  'filter.tolerance': {
    label: 'tolerance, at most',
    kind: 'fraction',
    bounds: { from: 0, to: 1 },
    help: 'How far a new part may lie from its nominal value at most; parts of unknown tolerance are left out.',
  },
  quantity: CONDITION_FIELDS.quantity,
} as const satisfies Record<string, QuantityField>;
