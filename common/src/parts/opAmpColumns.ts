import { normaliseWord } from './normalise.js';
import { OP_AMP_PARAMETERS, type OpAmpParameterKey } from './opAmpParameters.js';
import { INPUT_TYPE_FIELD, PART_FIELDS, type PartFieldKey } from './partFields.js';

/** What a column of a parts list holds. */
export type OpAmpColumn =
  | { holds: 'text'; key: PartFieldKey | 'inputType' }
  | { holds: 'figure'; key: OpAmpParameterKey; unit: string }
  | { holds: 'origin'; key: OpAmpParameterKey };

/** The columns of a list by their headings; a heading that means nothing of an op-amp is left out. */
export type OpAmpColumns = ReadonlyMap<string, OpAmpColumn>;

const TEXT_WORDS = wordsOf([...PART_FIELDS, INPUT_TYPE_FIELD]);
const FIGURE_WORDS = wordsOf(OP_AMP_PARAMETERS);
const ORIGIN_WORDS = new Map(
  OP_AMP_PARAMETERS.flatMap(({ key, label }) => [
    [normaliseWord(`${label} origin`), key],
    [normaliseWord(`${key} origin`), key],
  ]),
);

/** What each of a list's headings means; see {@link readOpAmpHeading}. */
export function readOpAmpHeadings(headings: readonly string[]): OpAmpColumns {
  const columns = new Map<string, OpAmpColumn>();
  for (const heading of headings) {
    const column = readOpAmpHeading(heading);
    if (column !== null) columns.set(heading, column);
  }
  return columns;
}

/**
 * What a heading of a parts list means, or null where it means nothing of an op-amp. A heading is a
 * field's label, key or synonym, compared without case, accents and punctuation; a unit stands behind
 * it in brackets ("voltage noise [nV/√Hz]"), and "voltage noise origin" heads that figure's origins.
 */
export function readOpAmpHeading(heading: string): OpAmpColumn | null {
  const { name, unit } = splitUnit(heading);
  const word = normaliseWord(name);
  const text = TEXT_WORDS.get(word);
  if (text !== undefined) return { holds: 'text', key: text };
  const figure = FIGURE_WORDS.get(word);
  if (figure !== undefined) return { holds: 'figure', key: figure, unit };
  const origin = ORIGIN_WORDS.get(word);
  return origin === undefined ? null : { holds: 'origin', key: origin };
}

function splitUnit(heading: string): { name: string; unit: string } {
  const match = /^([^[]*)\[(.*)\]\s*$/s.exec(heading) ?? /^([^(]*)\((.*)\)\s*$/s.exec(heading);
  return match === null ? { name: heading, unit: '' } : { name: match[1], unit: match[2].trim() };
}

function wordsOf<Key extends string>(
  fields: readonly { key: Key; label: string; synonyms: readonly string[] }[],
): Map<string, Key> {
  return new Map(
    fields.flatMap(({ key, label, synonyms }) =>
      [label, key, ...synonyms].map((name): [string, Key] => [normaliseWord(name), key]),
    ),
  );
}
