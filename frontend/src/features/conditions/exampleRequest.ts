import type { RankingRequest } from '@roothertz/common/conditions';
import { STAGE_DEFAULTS, type StageKind } from './stageKind';

/** What an address says that names a stage and nothing else, and what a team without named conditions begins with. */
export function exampleRequest(kind: StageKind): RankingRequest {
  return {
    conditions: {
      source: { resistance: kind === 'transimpedance' ? 1e6 : 1000, inductance: 0, capacitance: 0 },
      ambientTemperature: 298.15,
      band: { lower: 20, upper: 20e3, lowPassOrder: 0 },
      stage: STAGE_DEFAULTS[kind],
      referenceFrequency: 1000,
      bandwidthMargin: 3,
      amplifierTemperatureModel: 'estimated',
    },
    quantity: 1,
  };
}
