import type { RankingRequest, StageConditions } from '@roothertz/common/conditions';

/** The request with the network of a whole stage: what of it the operating conditions have. */
export function withNetworkOf(request: RankingRequest, found: StageConditions): RankingRequest {
  const { stage } = request.conditions;
  const { gain, gainResistance, feedbackResistance, gainNoiseIndex, feedbackNoiseIndex } = found;
  const network = { gain, gainResistance, feedbackResistance, gainNoiseIndex, feedbackNoiseIndex };
  const stated = Object.fromEntries(Object.entries(network).filter(([, value]) => value !== undefined));
  return { ...request, conditions: { ...request.conditions, stage: { ...stage, ...stated } } };
}
