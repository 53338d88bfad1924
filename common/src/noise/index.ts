export * from './cautions.js';
export * from './contributors.js';
export * from './figures.js';
