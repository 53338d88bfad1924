import type { FieldError } from './fieldError.js';
import type { ParameterDefinition } from './parameter.js';
import type { LibraryPart } from './part.js';
import type { ChoiceField } from './partFields.js';

/** The kinds of part that a library keeps. */
export const PART_KINDS = ['op-amp', 'resistor'] as const;
export type PartKind = (typeof PART_KINDS)[number];

/** Under which name a part holds its parameters. */
export type ParameterGroup = 'amplifier' | 'resistor';

/** The fields that a kind of part has in a list, a form or a table. */
export interface ListedFields {
  group: ParameterGroup;
  /** The choice of words among the parameters. */
  choice: ChoiceField;
  parameters: readonly ParameterDefinition[];
}

/** All that tells one kind of part from another: API, database, lists and forms are made from it. */
export interface PartCatalogue<Part extends LibraryPart> extends ListedFields {
  kind: PartKind;
  /** The parameter that no two names of one part differ in; null = none. */
  nominal: string | null;
  /** What is wrong between figures that are each within their own bounds; empty = the part can be kept. */
  check: (part: Part) => FieldError[];
}
