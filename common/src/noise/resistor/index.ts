export * from './rankResistors.js';
export * from './resistorCautions.js';
export * from './resistorConditions.js';
export * from './resistorNoise.js';
