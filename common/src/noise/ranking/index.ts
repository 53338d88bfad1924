export * from './columns.js';
export * from './exclusionDetail.js';
export {
  rankAmplifiers,
  RANKING_SORTS,
  type RankedPart,
  type Ranking,
  type RankingQuery,
  type RankingSort,
} from './rankAmplifiers.js';
export * from './quietestMap.js';
export { findExcluded, type ExcludedPart, type PartPlace } from './sift.js';
