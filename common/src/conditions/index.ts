export * from './conditionFields.js';
export * from './conditions.js';
export * from './checkConditions.js';
export * from './resistorConditionFields.js';
export * from './resistorConditions.js';
export * from './checkResistorConditions.js';
