export * from './checkStageSearch.js';
export { rankStages, type RankedStage, type StageRanking } from './rankStages.js';
export * from './stageSearch.js';
export * from './stageSearchFields.js';
