/** What can be imported. */
export const IMPORT_KINDS = ['op-amps', 'resistors', 'prices'] as const;
export type ImportKind = (typeof IMPORT_KINDS)[number];
export type PartListKind = Exclude<ImportKind, 'prices'>;

/**
 * Where an import stands. `waiting` = another import of the team is being applied; `outdated` = parts or
 * offers were edited since the check; `interrupted` = the server ended meanwhile, and the library is as before.
 */
export const IMPORT_STATES = [
  'uploaded',
  'checking',
  'checked',
  'waiting',
  'applying',
  'applied',
  'undoing',
  'undone',
  'cancelled',
  'interrupted',
  'outdated',
  'failed',
] as const;
export type ImportState = (typeof IMPORT_STATES)[number];

/** Somebody is at work on the import. */
export const RUNNING_STATES = [
  'checking',
  'waiting',
  'applying',
  'undoing',
] as const satisfies readonly ImportState[];

export function isRunning(state: ImportState): boolean {
  return RUNNING_STATES.some((running) => running === state);
}

/** The states in which columns can be mapped and rows checked. */
export const MAPPABLE_STATES = [
  'uploaded',
  'checked',
  'cancelled',
  'interrupted',
  'outdated',
  'failed',
] as const satisfies readonly ImportState[];

/** The states in which checked rows can be applied. */
export const APPLICABLE_STATES = [
  'checked',
  'cancelled',
  'interrupted',
  'failed',
] as const satisfies readonly ImportState[];
