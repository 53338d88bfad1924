/** What becomes of a row; a doubtful one is accepted with a caution. */
export const ROW_STATES = ['new', 'changed', 'unchanged', 'doubtful', 'refused'] as const;
export type RowState = (typeof ROW_STATES)[number];

export type PartValue = string | number | null;

/** A field of a part that a row changes, by its path such as `amplifier.voltageNoise`; null = unknown. */
export interface FieldChange {
  field: string;
  old: PartValue;
  new: PartValue;
}

/** Why a row is refused. */
export interface RowError {
  /** The column's place from 0; null where the list has no column for it. */
  column: number | null;
  /** The cell as it stands in the file. */
  value: string;
  why: string;
  expected: string;
}

export const DOUBT_CODES = [
  'below-shot-noise',
  'implausibly-quiet',
  'factor-of-1000',
  'contradiction',
  'repeated',
  'price-slip',
  'new-supplier',
  'in-use',
] as const;
export type DoubtCode = (typeof DOUBT_CODES)[number];

/** What makes a row suspicious that could be kept. */
export interface Doubt {
  code: DoubtCode;
  /** The path of the figure in doubt; null where the whole row is. */
  field: string | null;
  message: string;
}

/** What an import would do with one row, before it does it. */
export type RowVerdict<Part> =
  | { state: 'refused'; errors: RowError[] }
  | { state: 'unchanged'; part: Part; doubts: Doubt[] }
  | { state: 'new' | 'changed' | 'doubtful'; part: Part; changes: FieldChange[]; doubts: Doubt[] };
