export * from './columns.js';
export * from './exclusionDetail.js';
export {
  findExcluded,
  rankAmplifiers,
  RANKING_SORTS,
  type ExcludedPart,
  type PartPlace,
  type RankedPart,
  type Ranking,
  type RankingQuery,
  type RankingSort,
} from './rankAmplifiers.js';
