import {
  expectedColumns,
  type LibraryPart,
  type PartCatalogue,
  partOfValues,
  pathOfColumn,
  type Reading,
  readMissingColumn,
  readPartCell,
  valuesOfPart,
} from '../parts/index.js';
import { doubtsOf } from './doubts.js';
import type { ImportRowReader, ImportRowReading } from './importRow.js';
import type { Doubt, FieldChange, PartValue, RowError, RowVerdict } from './rowVerdict.js';

/** What is there already of the part that a row describes. */
export interface KnownParts<Part> {
  /** The team's own part of the same key. */
  existing: Part | null;
  /** The curated library's part of the same key. */
  curated: Part | null;
}

/**
 * Makes the judge of a list's rows. A new part takes defaults for what its row doesn't state; of an existing
 * part, what the row doesn't state stays as it is: an empty cell never takes away what the library knows. Its names
 * stay as the library spells them, for "ACME  corp." of a list is no change of "Acme Corp".
 */
export function rowJudge<Part extends LibraryPart>(
  catalogue: PartCatalogue<Part>,
  reader: ImportRowReader,
): (reading: Extract<ImportRowReading, { ok: true }>, known: KnownParts<Part>) => RowVerdict<Part> {
  const defaults = expectedColumns(catalogue).map((column): [string, Reading<PartValue>] => {
    const path = pathOfColumn(catalogue, column);
    return [
      path,
      reader.has(path) ? readPartCell(catalogue, column, '') : readMissingColumn(catalogue, column),
    ];
  });
  const withDefaults = (reading: Extract<ImportRowReading, { ok: true }>) => {
    const values = new Map(reading.stated);
    const errors: RowError[] = [];
    for (const [path, fallback] of defaults) {
      if (values.has(path)) continue;
      if (fallback.ok) values.set(path, fallback.value);
      else errors.push(reader.errorAt(path, fallback.message, reading.cells));
    }
    return { values, errors };
  };
  return (reading, { existing, curated }) => {
    const current = existing && valuesOfPart(catalogue, existing);
    const { values, errors } =
      current === null
        ? withDefaults(reading)
        : { values: new Map([...current, ...withoutNames(reading.stated)]), errors: [] };
    if (errors.length > 0) return { state: 'refused', errors };
    const part = partOfValues<Part>(catalogue, values);
    const doubts = [...contradictions(catalogue, part), ...doubtsOf(catalogue, part, [existing, curated])];
    const changes = current && changesBetween(current, valuesOfPart(catalogue, part));
    if (changes?.length === 0) return { state: 'unchanged', part, doubts };
    const state = changes === null ? 'new' : 'changed';
    return { state: doubts.length > 0 ? 'doubtful' : state, part, changes: changes ?? [], doubts };
  };
}

function withoutNames(stated: ReadonlyMap<string, PartValue>): [string, PartValue][] {
  return [...stated].filter(([path]) => path !== 'manufacturer' && path !== 'partNumber');
}

/** Limits that contradict each other are the list’s to mend, and no reason to leave the rest of the part out. */
function contradictions<Part extends LibraryPart>(catalogue: PartCatalogue<Part>, part: Part): Doubt[] {
  return catalogue.check(part).map((fault) => ({ code: 'contradiction', ...fault }));
}

function changesBetween(
  current: ReadonlyMap<string, PartValue>,
  next: ReadonlyMap<string, PartValue>,
): FieldChange[] {
  const paths = new Set([...current.keys(), ...next.keys()]);
  return [...paths]
    .map((field) => ({ field, old: current.get(field) ?? null, new: next.get(field) ?? null }))
    .filter((change) => change.old !== change.new);
}
