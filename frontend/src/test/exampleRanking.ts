import type { RankingRequest } from '@roothertz/common/conditions';
import { rankedItem, rankingOf } from './rankings';

/** A 1 kΩ source in 20 Hz to 20 kHz at a gain of 100. */
export const EXAMPLE: RankingRequest = {
  conditions: {
    source: { resistance: 1000, inductance: 0, capacitance: 0 },
    ambientTemperature: 298.15,
    band: { lower: 20, upper: 20e3, lowPassOrder: 0 },
    stage: { topology: 'non-inverting', gain: 100, gainResistance: 4 },
    referenceFrequency: 1000,
    bandwidthMargin: 3,
    amplifierTemperatureModel: 'estimated',
  },
  quantity: 1,
};

/** Two parts at a request: the second with twice the voltage noise. */
export function exampleRanking(request: RankingRequest = EXAMPLE) {
  const items = [
    rankedItem(request, 1, 'VR-1108'),
    rankedItem(request, 2, 'LQ-12', { voltageNoise: 2.2e-9 }),
  ];
  return { request, items, answer: rankingOf(request, items) };
}
