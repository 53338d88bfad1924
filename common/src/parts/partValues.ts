import { type LibraryPart, originsOfKnown } from './part.js';
import type { ListedFields } from './partCatalogue.js';
import type { PartColumn } from './partColumns.js';
import { PART_FIELDS } from './partFields.js';

/** What a part must have or falls back to, whether the list has a column for it or not. */
export function expectedColumns({ choice, parameters }: ListedFields): PartColumn[] {
  return [
    ...[...PART_FIELDS, choice].map(({ key }): PartColumn => ({ holds: 'text', key })),
    ...parameters.map(({ key }): PartColumn => ({ holds: 'figure', key, unit: '' })),
  ];
}

/** Where a part holds what a column states, such as `amplifier.voltageNoise` or `origins.voltageNoise`. */
export function pathOfColumn({ group, choice }: ListedFields, { holds, key }: PartColumn): string {
  if (holds === 'origin') return `origins.${key}`;
  return holds === 'figure' || key === choice.key ? `${group}.${key}` : key;
}

/** The part that holds these values, each at its path. */
export function partOfValues<Part>({ group }: ListedFields, values: ReadonlyMap<string, unknown>): Part {
  const part: Record<string, unknown> = {};
  const parameters: Record<string, unknown> = {};
  const origins: Record<string, string> = {};
  for (const [path, value] of values) {
    const [place, key] = pieces(path);
    if (place === group) parameters[key] = value;
    else if (place !== 'origins') part[place] = value;
    else if (value !== null) origins[key] = value as string;
  }
  return { ...part, [group]: parameters, origins: originsOfKnown(parameters, origins as object) } as Part;
}

const PIECES = new Map<string, readonly string[]>();

/** A catalogue has few paths, and a long list reads them in each row. */
function pieces(path: string): readonly string[] {
  const known = PIECES.get(path) ?? path.split('.');
  PIECES.set(path, known);
  return known;
}

/** The values of a part by their paths: the inverse of {@link partOfValues}. */
export function valuesOfPart<Part extends LibraryPart>(
  catalogue: ListedFields,
  part: Part,
): Map<string, string | number | null> {
  const columns = expectedColumns(catalogue);
  const values = columns.map((column): [string, string | number | null] => {
    const path = pathOfColumn(catalogue, column);
    return [path, valueAt(part, path)];
  });
  const origins = Object.entries(part.origins).map(([key, origin]): [string, string] => [
    `origins.${key}`,
    origin!,
  ]);
  return new Map([...values, ...origins]);
}

function valueAt(part: object, path: string): string | number | null {
  return pieces(path).reduce((place: unknown, key) => (place as Record<string, unknown>)[key], part) as
    string | number | null;
}
