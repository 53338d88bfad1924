import { NOISE_PARAMETERS, type AmplifierColumns } from './columns.js';

/** Rows of a library in classes: what a filter's words, a temperature or an origin says of one row it says of all. */
export interface PartClasses {
  /** the class of each row */
  of: Uint32Array;
  /** a row of each class */
  examples: number[];
}

/** The classes of rows that no word tells apart: a library has few. */
export function classifyParts(columns: AmplifierColumns): PartClasses {
  const { count, lifecycle, approval, inputType, package: packages, origins } = columns;
  const of = new Uint32Array(count);
  const words = [lifecycle, approval, inputType, packages, ...NOISE_PARAMETERS.map((key) => origins[key])];
  for (const column of words) split(of, column);
  const examples: number[] = [];
  for (let row = 0; row < count; row++) examples[of[row]] ??= row;
  return { of, examples };
}

/** Splits each class by a column's words. */
function split(of: Uint32Array, words: readonly (string | null)[]): void {
  const within: Map<string | null, number>[] = [];
  let classes = 0;
  for (let row = 0; row < of.length; row++) {
    const known = (within[of[row]] ??= new Map());
    let number = known.get(words[row]);
    if (number === undefined) known.set(words[row], (number = classes++));
    of[row] = number;
  }
}
