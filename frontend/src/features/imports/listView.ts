import type { ColumnForm, ColumnMapping, FieldChange, ListColumns } from '@roothertz/common/imports';
import type { ChangeWords } from './changeWords';
import type { Becomes } from './mappingDraft';

export interface FieldChoice {
  value: Becomes;
  label: string;
}

/** What a column can become: single choices, and groups of them. */
export type FieldChoices = readonly (FieldChoice | { label: string; options: FieldChoice[] })[];

/** How the page shows the columns and the values of a kind of list. */
export interface ListView {
  columns: ListColumns;
  choices: FieldChoices;
  /** The unit of a column that names none; null = it has none. */
  usualUnit(form: ColumnForm, field: string): string | null;
  /** The units that a column may be in; empty = it has none. */
  units(mapped: ColumnMapping): { value: string; label: string }[];
  changeWords(change: FieldChange): ChangeWords;
}

/** What a column becomes, as the choices call it. */
export function becomesWords(choices: FieldChoices, becomes: Becomes): string {
  const all = choices.flatMap((entry) => ('options' in entry ? entry.options : [entry]));
  return all.find(({ value }) => value === becomes)?.label ?? 'left out';
}
