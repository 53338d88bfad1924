export * from './conditionFields.js';
export * from './conditions.js';
export * from './checkConditions.js';
