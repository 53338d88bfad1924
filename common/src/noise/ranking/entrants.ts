import type { OperatingConditions } from '../../conditions/index.js';
import type { StageModel } from '../stage/model.js';
import type { AmplifierColumns } from './columns.js';
import { leastNoise, type LeastNoise } from './leastNoise.js';
import { scoreRows, type Scores } from './scores.js';

/** The rows that are ranked, one array a library. */
export interface Field {
  conditions: OperatingConditions;
  model: StageModel;
  libraries: readonly AmplifierColumns[];
  accepted: readonly Uint32Array[];
}

/** The rows that are ranked, and what is known of their noise before any is scored. */
export interface Entrants extends Field {
  /** lower bounds in the order of `accepted`; null for a library all rows of which are to be scored */
  bounds: readonly (LeastNoise | null)[];
}

/** From this many parts on, bounds cost less than they save. */
const WORTH_BOUNDING = 4000;

/** Bounds the rows of large libraries, where no notch can make a bound wrong. */
export function withBounds(field: Field): Entrants {
  const { conditions, model, libraries, accepted } = field;
  const bounds = accepted.map((rows, library) =>
    rows.length < WORTH_BOUNDING || model.canNotch
      ? null
      : leastNoise(conditions, model, libraries[library], rows),
  );
  return { ...field, bounds };
}

/** All rows are to be scored. */
export function withoutBounds(field: Field): Entrants {
  return { ...field, bounds: field.libraries.map(() => null) };
}

/** Scores some rows of one of the libraries. */
export function score({ conditions, model, libraries }: Field, library: number, rows: Uint32Array): Scores {
  return scoreRows(conditions, model, libraries[library], rows);
}
