export * from './actorWords.js';
export * from './auditActions.js';
export * from './describeChange.js';
