export * from './columns.js';
export type { CheapestPart } from './cheapest.js';
export * from './exclusionDetail.js';
export {
  PRICED_RANKING_SORTS,
  rankAmplifiers,
  RANKING_SORTS,
  type RankedPart,
  type Ranking,
  type RankingQuery,
  type RankingSort,
} from './rankAmplifiers.js';
export * from './quietestMap.js';
export { findExcluded, type ExcludedPart, type PartPlace } from './sift.js';
