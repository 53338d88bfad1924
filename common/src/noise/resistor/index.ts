export * from './rankResistors.js';
export * from './resistorCautions.js';
export * from './resistorNoise.js';
