export * from './passwordFault.js';
