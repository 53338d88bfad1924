import { normaliseWord } from './normalise.js';
import { PART_FIELDS } from './partFields.js';
import type { ListedFields } from './partCatalogue.js';

/** What a column of a parts list holds, by the key of the field or parameter. */
export type PartColumn =
  | { holds: 'text'; key: string }
  | { holds: 'figure'; key: string; unit: string }
  | { holds: 'origin'; key: string };

/** The columns of a list by their headings; a heading that means nothing of the kind of part is left out. */
export type PartColumns = ReadonlyMap<string, PartColumn>;

/**
 * What the headings of a parts list mean. A heading is a field's label, key or synonym, compared without
 * case, accents and punctuation; a unit stands behind it in brackets ("voltage noise [nV/√Hz]"), and
 * "voltage noise origin" heads that figure's origins.
 */
export function readPartHeadings(catalogue: ListedFields, headings: readonly string[]): PartColumns {
  const read = headingReader(catalogue);
  const columns = new Map<string, PartColumn>();
  for (const heading of headings) {
    const column = read(heading);
    if (column !== null) columns.set(heading, column);
  }
  return columns;
}

/** Reads one heading after the other as {@link readPartHeadings} does; null = it means nothing. */
export function headingReader({ choice, parameters }: ListedFields): (heading: string) => PartColumn | null {
  const texts = wordsOf([...PART_FIELDS, choice]);
  const figures = wordsOf(parameters);
  const origins = new Map(
    parameters.flatMap(({ key, label }) =>
      [label, key].map((name): [string, string] => [normaliseWord(`${name} origin`), key]),
    ),
  );
  return (heading) => {
    const { name, unit } = splitUnit(heading);
    const word = normaliseWord(name);
    const text = texts.get(word);
    if (text !== undefined) return { holds: 'text', key: text };
    const figure = figures.get(word);
    if (figure !== undefined) return { holds: 'figure', key: figure, unit };
    const origin = origins.get(word);
    return origin === undefined ? null : { holds: 'origin', key: origin };
  };
}

function splitUnit(heading: string): { name: string; unit: string } {
  const match = /^([^[]*)\[(.*)\]\s*$/s.exec(heading) ?? /^([^(]*)\((.*)\)\s*$/s.exec(heading);
  return match === null ? { name: heading, unit: '' } : { name: match[1], unit: match[2].trim() };
}

function wordsOf(
  fields: readonly { key: string; label: string; synonyms: readonly string[] }[],
): Map<string, string> {
  return new Map(
    fields.flatMap(({ key, label, synonyms }) =>
      [label, key, ...synonyms].map((name): [string, string] => [normaliseWord(name), key]),
    ),
  );
}
