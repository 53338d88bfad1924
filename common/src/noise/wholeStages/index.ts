export * from './checkStageSearch.js';
export * from './pieces.js';
export { rankStages, type RankedStage, type StageRanking, type WholeStage } from './rankStages.js';
export type { StagePrices } from './stageCosts.js';
export * from './stageSearch.js';
export * from './stageSearchFields.js';
