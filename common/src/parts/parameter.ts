import type { QuantityKind } from '../units/index.js';

/** Bounds of a physical value in SI units. `above` is exclusive, `from` and `to` are inclusive. */
export interface Bounds {
  above?: number;
  from?: number;
  /** The least value above 0, where 0 stands for “none”. */
  least?: number;
  to: number;
}

/** What every catalogue says of one numeric field, for forms, API, grid and import alike. */
export interface QuantityField {
  label: string;
  /** The symbol that the trade writes, such as `e_n`. */
  symbol?: string;
  kind: QuantityKind;
  bounds: Bounds;
  /** Only whole numbers are allowed. */
  integer?: boolean;
  /** One sentence for the field's help. */
  help: string;
}

/** What a ranking can't say where a parameter is unknown. */
export interface Gap {
  /**
   * How much the ranking misses it: 8 = its total is only a bound, 5–6 = the part stands better than it may be, 2–3 = a
   * limit isn't checked or the total is too low at some sources, 1 = nothing depends on it. Our judgement, no source.
   */
  weight: number;
  /** In one sentence. */
  meaning: string;
}

/** One parameter of a part: the single place where form, API, grid, database column and import learn of it. */
export interface ParameterDefinition<Key extends string = string> extends QuantityField {
  key: Key;
  /** A part can't be saved without it. */
  required?: boolean;
  /** What stands when the parameter is left out; `null` = unknown. */
  fallback: number | null;
  /** Left out = a part always has it. */
  gap?: Gap;
  /** The unit of the CSV column and of grid and form, such as `nV/√Hz`. */
  displayUnit: string;
  /** Other names that lists give this column; compared without case, accents and punctuation. */
  synonyms: readonly string[];
  /** Names that may mean the parameter, and do where no other column is surer. */
  perhaps?: readonly string[];
}

/** Whether a part can be kept without the parameter: not what is required, and not a count. */
export function canBeUnknown(parameter: ParameterDefinition): boolean {
  return !parameter.required && parameter.kind !== 'count';
}
