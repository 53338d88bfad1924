export * from './addressFault.js';
export * from './passwordFault.js';
