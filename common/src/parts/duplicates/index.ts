export * from './duplicateReasons.js';
export { findDuplicates, searchDuplicates, type ComparedPart, type DuplicatePair } from './findDuplicates.js';
