export * from './columns.js';
export type { CheapestPart } from './cheapest.js';
export * from './exclusionDetail.js';
export { rankAmplifiers, type Ranking, type RankingQuery } from './rankAmplifiers.js';
export type { RankedPart } from './rankedPart.js';
export { PRICED_RANKING_SORTS, RANKING_SORTS, type RankingSort } from './sortKeys.js';
export * from './quietestMap.js';
export { findExcluded, type ExcludedPart, type ExclusionCounts, type PartPlace } from './sift.js';
