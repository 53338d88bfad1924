import type { Origins, PartFields } from './part.js';
import type { ResistorParameterKey } from './resistorParameters.js';
import type { Technology } from './technology.js';

/**
 * A resistor's parameters in SI units, as API, database and noise model use them; `null` = unknown.
 * Only the resistance is always known.
 */
export type Resistor = { technology: Technology | null; resistance: number } & Record<
  Exclude<ResistorParameterKey, 'resistance'>,
  number | null
>;

export type ResistorOrigins = Origins<ResistorParameterKey>;

/** A resistor as a library keeps it. */
export interface ResistorPart extends PartFields {
  resistor: Resistor;
  origins: ResistorOrigins;
}
