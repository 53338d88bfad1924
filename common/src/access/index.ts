export * from './actions.js';
export * from './planState.js';
export * from './plans.js';
export * from './roles.js';
