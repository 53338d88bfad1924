import { describe, expect, it } from 'vitest';
import { checkStageSearch } from './checkStageSearch.js';
import type { SoughtConditions, SoughtStage } from './stageSearch.js';

const sought = (stage: Partial<SoughtStage>, change: Partial<SoughtConditions> = {}): SoughtConditions => ({
  source: { resistance: 200, inductance: 0, capacitance: 0 },
  ambientTemperature: 298.15,
  band: { lower: 20, upper: 20e3, lowPassOrder: 0 },
  referenceFrequency: 1000,
  bandwidthMargin: 3,
  amplifierTemperatureModel: 'none',
  ...change,
  stage: {
    topology: 'non-inverting',
    gain: 100,
    gainTolerance: 0.01,
    network: { minimumTotal: 500, maximumTotal: 1e5 },
    parallelMaximum: 1,
    ...stage,
  },
});

describe('checkStageSearch', () => {
  it.each([
    sought({}),
    sought({ outputVoltage: -5 }),
    sought({ gain: 1 }),
    sought(
      { topology: 'inverting', gain: 0.5 },
      { source: { resistance: 0, inductance: 0, capacitance: 0 } },
    ),
    sought({ topology: 'transimpedance', gain: undefined, feedbackResistance: 1e6 }),
    sought({ topology: 'difference', gain: 0.5 }),
    sought({ topology: 'instrumentation', gain: 1, differenceResistance: 1000 }),
    sought({ parallelMaximum: 8 }),
  ])('takes a search that can be met: %#', (conditions) => {
    expect(checkStageSearch(conditions)).toEqual([]);
  });

  it.each([
    ['conditions.stage.gainTolerance', sought({ gainTolerance: 0.9 })],
    ['conditions.stage.parallelMaximum', sought({ parallelMaximum: 9 })],
    ['conditions.stage.parallelMaximum', sought({ parallelMaximum: 1.5 })],
    ['conditions.stage.parallelMaximum', sought({ topology: 'inverting', parallelMaximum: 2 })],
    ['conditions.stage.parallelMaximum', sought({ topology: 'instrumentation', parallelMaximum: 2 })],
    ['conditions.stage.differenceResistance', sought({ differenceResistance: 1000 })],
    ['conditions.stage.gain', sought({ topology: 'instrumentation', gain: 0.5 })],
    ['conditions.stage.network.maximumTotal', sought({ network: { minimumTotal: 500, maximumTotal: 400 } })],
    ['conditions.stage.network.maximumTotal', sought({ network: { minimumTotal: 500, maximumTotal: NaN } })],
    ['conditions.stage.outputVoltage', sought({ outputVoltage: Infinity })],
    ['conditions.stage.gain', sought({ gain: 0.5 })],
    ['conditions.stage.gain', sought({ gain: undefined })],
    ['conditions.stage.feedbackResistance', sought({ topology: 'transimpedance', gain: undefined })],
    ['conditions.referenceFrequency', sought({}, { referenceFrequency: 1 })],
  ])('refuses at %s', (field, conditions) => {
    expect(checkStageSearch(conditions).map((error) => error.field)).toContain(field);
  });
});
