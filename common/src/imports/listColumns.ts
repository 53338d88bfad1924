import { type FieldError, type ListedFields, PART_FIELDS } from '../parts/index.js';
import { checkMapping } from './checkMapping.js';
import type { ColumnMapping } from './columnMapping.js';
import { columnProposer, proposeField, type ProposedColumn } from './proposeColumn.js';
import { NOT_STATED, type WholeList } from './wholeList.js';

/** How the columns of one kind of list are recognised and checked. */
export interface ListColumns {
  /** Makes a reader of headings, one after the other; it gives null where a heading's words mean nothing. */
  proposer(): (heading: string) => ProposedColumn | null;
  /** What a column becomes whose field is known: unit, frequency and quantity are read from its heading. */
  proposeField(field: string, heading: string): ProposedColumn;
  /** What the fields are called, for headings that only resemble them. */
  names: readonly FieldName[];
  /** What is wrong with a mapping, by paths such as `columns.3.unit`; empty = the rows can be read. */
  check(mapping: readonly ColumnMapping[], columnCount: number, wholeList?: WholeList): FieldError[];
}

/** A name of a field; one that isn't sure may mean something else. */
export interface FieldName {
  field: string;
  name: string;
  isSure: boolean;
}

/** The columns of a list of parts of a kind. */
export function partColumns(catalogue: ListedFields): ListColumns {
  return {
    proposer: () => columnProposer(catalogue),
    proposeField: (field, heading) => proposeField(catalogue, field, heading),
    names: namesOf([...PART_FIELDS, catalogue.choice, ...catalogue.parameters]),
    check: (mapping, columnCount, wholeList = NOT_STATED) => [
      ...checkMapping(catalogue, mapping, columnCount),
      ...Object.entries(wholeList)
        .filter(([, value]) => value !== null)
        .map(([field]) => ({ field: `wholeList.${field}`, message: 'a list of parts has no such value' })),
    ],
  };
}

/** Every name of each field. */
export function namesOf(
  fields: readonly { key: string; label: string; synonyms: readonly string[]; perhaps?: readonly string[] }[],
): FieldName[] {
  return fields.flatMap(({ key: field, label, synonyms, perhaps = [] }) => [
    ...[label, ...synonyms].map((name) => ({ field, name, isSure: true })),
    ...perhaps.map((name) => ({ field, name, isSure: false })),
  ]);
}
