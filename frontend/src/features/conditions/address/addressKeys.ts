import { AMPLIFIER_TEMPERATURE_MODELS, type ConditionFieldPath } from '@roothertz/common/conditions';
import { APPROVALS, INPUT_TYPES, LIBRARIES, LIFECYCLES } from '@roothertz/common/parts';

/** The numeric fields' keys in the address, in the order in which they stand there. */
export const QUANTITY_KEYS = {
  rs: 'conditions.source.resistance',
  ls: 'conditions.source.inductance',
  cs: 'conditions.source.capacitance',
  ts: 'conditions.source.temperature',
  id: 'conditions.source.directCurrent',
  gain: 'conditions.stage.gain',
  rg: 'conditions.stage.gainResistance',
  rl: 'conditions.stage.loadResistance',
  rb: 'conditions.stage.biasResistance',
  rd: 'conditions.stage.differenceResistance',
  rf: 'conditions.stage.feedbackResistance',
  cf: 'conditions.stage.feedbackCapacitance',
  vout: 'conditions.stage.outputVoltage',
  nig: 'conditions.stage.gainNoiseIndex',
  nif: 'conditions.stage.feedbackNoiseIndex',
  net: 'conditions.stage.network.minimumTotal',
  f1: 'conditions.band.lower',
  f2: 'conditions.band.upper',
  lp: 'conditions.band.lowPassOrder',
  fref: 'conditions.referenceFrequency',
  ta: 'conditions.ambientTemperature',
  margin: 'conditions.bandwidthMargin',
  vmin: 'filter.supply.minimum',
  vmax: 'filter.supply.maximum',
  ch: 'filter.channels',
  target: 'target.inputNoiseRms',
  qty: 'quantity',
} as const satisfies Record<string, ConditionFieldPath>;

/** The choices' keys: one word each, or several with spaces (`+` in the address) between them. */
export const CHOICE_KEYS = {
  model: {
    path: 'conditions.amplifierTemperatureModel',
    words: AMPLIFIER_TEMPERATURE_MODELS,
    several: false,
  },
  lib: { path: 'filter.library', words: LIBRARIES, several: true },
  life: { path: 'filter.lifecycle', words: LIFECYCLES, several: true },
  appr: { path: 'filter.approval', words: APPROVALS, several: true },
  input: { path: 'filter.inputType', words: INPUT_TYPES, several: true },
} as const satisfies Record<string, { path: string; words: readonly string[]; several: boolean }>;

export const TEXT_KEYS = { pkg: 'filter.package', q: 'filter.search' } as const;

export const STAGE_KEY = 'stage';
