import type { QuantityField } from '../parts/index.js';

/**
 * Every numeric field of the operating conditions, the filter and the target by its path: the single
 * place where form, API documentation and checks learn of its label, its bounds and its help.
 */
export const CONDITION_FIELDS = {
  'conditions.source.resistance': {
    label: 'source resistance',
    symbol: 'R_s',
    kind: 'resistance',
    bounds: { from: 0, least: 1e-9, to: 1e13 },
    help: 'Resistance in series with the source’s voltage, or across its current in a transimpedance stage.',
  },
  'conditions.source.inductance': {
    label: 'source inductance',
    symbol: 'L_s',
    kind: 'inductance',
    bounds: { from: 0, least: 1e-15, to: 1e5 },
    help: 'Inductance in series with the source resistance, as of a coil; 0 = none.',
  },
  'conditions.source.capacitance': {
    label: 'source capacitance',
    symbol: 'C_s',
    kind: 'capacitance',
    bounds: { from: 0, least: 1e-18, to: 1 },
    help: 'Capacitance across the source, with that of its cable; 0 = none.',
  },
  'conditions.source.temperature': {
    label: 'source temperature',
    symbol: 'T_s',
    kind: 'temperature',
    bounds: { from: 0.01, to: 3000 },
    help: 'Temperature of the source; left out = ambient.',
  },
  'conditions.source.directCurrent': {
    label: 'direct current of the detector',
    symbol: 'I_d',
    kind: 'current',
    bounds: { from: 0, least: 1e-21, to: 10 },
    help: 'Photocurrent and dark current; its shot noise belongs to the source.',
  },
  'conditions.ambientTemperature': {
    label: 'ambient temperature',
    symbol: 'T_a',
    kind: 'temperature',
    bounds: { from: 1, to: 1000 },
    help: 'Temperature of amplifier and resistors.',
  },
  'conditions.band.lower': {
    label: 'lower band limit',
    kind: 'frequency',
    bounds: { from: 1e-6, to: 1e12 },
    help: 'Where the band begins.',
  },
  'conditions.band.upper': {
    label: 'upper band limit',
    kind: 'frequency',
    bounds: { from: 1e-6, to: 1e12 },
    help: 'Where the band ends; the −3 dB frequency of a low-pass.',
  },
  'conditions.band.lowPassOrder': {
    label: 'low-pass order',
    kind: 'count',
    bounds: { from: 0, to: 10 },
    integer: true,
    help: '0 = brick wall; 1 to 10 = Butterworth low-pass of that order.',
  },
  'conditions.stage.gain': {
    label: 'gain',
    kind: 'gain',
    bounds: { from: 1e-3, to: 1e6 },
    help: 'Magnitude of the signal gain.',
  },
  'conditions.stage.gainResistance': {
    label: 'gain resistance',
    symbol: 'R_g',
    kind: 'resistance',
    bounds: { from: 0, least: 1e-6, to: 1e12 },
    help: 'From the − input to ground, to the source in an inverting and in each leg of a difference stage, or between the − inputs of an instrumentation stage.',
  },
  'conditions.stage.loadResistance': {
    label: 'load resistance',
    symbol: 'R_L',
    kind: 'resistance',
    bounds: { from: 1e-3, to: 1e15 },
    help: 'From the + input to ground: damping, termination or bias return; left out = none.',
  },
  'conditions.stage.differenceResistance': {
    label: 'difference resistance',
    symbol: 'R_d',
    kind: 'resistance',
    bounds: { from: 1e-3, to: 1e12 },
    help: 'Each of the four equal resistors behind the input pair of an instrumentation stage; left out = 10 kΩ.',
  },
  'conditions.stage.biasResistance': {
    label: 'bias resistance',
    symbol: 'R_b',
    kind: 'resistance',
    bounds: { from: 0, least: 1e-6, to: 1e12 },
    help: 'From the + input to ground in an inverting stage; 0 = none.',
  },
  'conditions.stage.feedbackResistance': {
    label: 'feedback resistance',
    symbol: 'R_f',
    kind: 'resistance',
    bounds: { from: 1e-3, to: 1e15 },
    help: 'Gain of a transimpedance stage in V/A.',
  },
  'conditions.stage.feedbackCapacitance': {
    label: 'feedback capacitance',
    symbol: 'C_f',
    kind: 'capacitance',
    bounds: { from: 0, least: 1e-18, to: 1 },
    help: 'Across the feedback resistor; “auto” = maximally flat for each amplifier.',
  },
  'conditions.stage.network.minimumTotal': {
    label: 'output drives at least',
    kind: 'resistance',
    bounds: { from: 1e-3, to: 1e12 },
    help: 'The least feedback network that the output can drive; a lower one is marked.',
  },
  'conditions.referenceFrequency': {
    label: 'reference frequency',
    symbol: 'f_ref',
    kind: 'frequency',
    bounds: { from: 1e-6, to: 1e12 },
    help: 'Where gain, density and noise figure are stated; inside the band.',
  },
  'conditions.bandwidthMargin': {
    label: 'bandwidth margin',
    kind: 'gain',
    bounds: { from: 0, to: 1e6 },
    help: 'Closed-loop bandwidth over the upper band limit that a part needs; 0 excludes none.',
  },
  'filter.channels': {
    label: 'channels, at least',
    kind: 'count',
    bounds: { from: 1, to: 16 },
    integer: true,
    help: 'Amplifiers that one package must hold.',
  },
  'filter.supply.minimum': {
    label: 'supply, lowest',
    kind: 'voltage',
    bounds: { from: 1e-3, to: 1e4 },
    help: 'Lowest total supply voltage, rail to rail.',
  },
  'filter.supply.maximum': {
    label: 'supply, highest',
    kind: 'voltage',
    bounds: { from: 1e-3, to: 1e4 },
    help: 'Highest total supply voltage, rail to rail.',
  },
  'target.inputNoiseRms': {
    label: 'target, input noise',
    kind: 'voltage',
    bounds: { from: 1e-21, to: 1e3 },
    help: 'Total noise referred to the source that must not be passed.',
  },
  quantity: {
    label: 'quantity',
    kind: 'count',
    bounds: { from: 1, to: 1e9 },
    integer: true,
    help: 'Pieces to buy.',
  },
} as const satisfies Record<string, QuantityField>;

export type ConditionFieldPath = keyof typeof CONDITION_FIELDS;
