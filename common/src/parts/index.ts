export * from './amplifier.js';
export * from './opAmpParameters.js';
export * from './parameter.js';
export * from './partFields.js';
export * from './vocabulary.js';
export * from './bounds.js';
export * from './fieldError.js';
