export * from './gaussLegendre.js';
export * from './panels.js';
export * from './roots.js';
export * from './smallest.js';
export * from './priorityQueue.js';
