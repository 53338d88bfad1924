export * from './duplicateReasons.js';
export { findDuplicates, type ComparedPart, type DuplicatePair } from './findDuplicates.js';
