export { rankStages, type RankedStage, type StageRanking } from './rankStages.js';
export * from './stageSearch.js';
