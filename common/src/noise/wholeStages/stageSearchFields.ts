import type { QuantityField } from '../../parts/index.js';

/** The numeric fields of a search for whole stages beside those of any operating conditions, by path. */
export const STAGE_SEARCH_FIELDS = {
  'conditions.stage.gainTolerance': {
    label: 'gain tolerance',
    kind: 'fraction',
    bounds: { from: 0, to: 0.2 },
    help: 'How far the gain of two library values may lie from the wanted one.',
  },
  'conditions.stage.network.maximumTotal': {
    label: 'network, at most',
    kind: 'resistance',
    bounds: { from: 1e-3, to: 1e15 },
    help: 'The largest feedback network that noise and leakage allow; left out = 100 kΩ, in a transimpedance stage none.',
  },
  'conditions.stage.parallelMaximum': {
    label: 'channels in parallel, at most',
    kind: 'count',
    bounds: { from: 1, to: 8 },
    integer: true,
    help: 'Identical channels of one package that may work in parallel.',
  },
  within: {
    label: 'within',
    kind: 'decibel',
    bounds: { from: 0, to: 60 },
    help: 'How far above the quietest stage the noise of one sorted by price may lie.',
  },
} as const satisfies Record<string, QuantityField>;
