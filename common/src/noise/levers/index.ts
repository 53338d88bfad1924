export * from './levers.js';
export * from './parallelStage.js';
export * from './transformer.js';
