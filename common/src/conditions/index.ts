export * from './conditionFields.js';
export * from './conditions.js';
