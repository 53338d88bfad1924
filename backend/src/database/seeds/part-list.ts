import {
  type FieldError,
  type LibraryPart,
  type PartCatalogue,
  readPartHeadings,
  readPartRow,
  readResistorSeries,
  type ResistorPart,
  resistorsOfSeries,
} from '@roothertz/common/parts';
import { parse } from 'csv-parse/sync';
import { readFileSync } from 'node:fs';

const DATA = new URL('../../../../data/', import.meta.url);

/** A row of a list, heading → cell, and the line on which it ends. */
export interface ListedRow {
  record: Record<string, string>;
  info: { lines: number };
}

/** The parts of a list in data/, read as an upload's rows are; the first fault ends it, naming line and field. */
export function readPartList<Kind extends LibraryPart>(catalogue: PartCatalogue<Kind>, path: string): Kind[] {
  const rows = readRows(path);
  const columns = readPartHeadings(catalogue, Object.keys(rows[0]?.record ?? {}));
  return rows.map((row) => accept(path, row, readPartRow(catalogue, row.record, columns)).part);
}

/** The resistors of a list of series in data/. */
export function readSeriesList(path: string): ResistorPart[] {
  return readRows(path).flatMap((row) =>
    resistorsOfSeries(accept(path, row, readResistorSeries(row.record)).series),
  );
}

export function readRows(path: string): ListedRow[] {
  return parse(readFileSync(new URL(path, DATA)), {
    bom: true,
    columns: true,
    info: true,
    skip_empty_lines: true,
  }) as unknown as ListedRow[];
}

function accept<Accepted extends { ok: true }>(
  path: string,
  { info }: ListedRow,
  reading: Accepted | { ok: false; errors: FieldError[] },
): Accepted {
  if (reading.ok) return reading;
  const [{ field, message }] = reading.errors;
  throw new Error(`data/${path}, line ${info.lines}, ${field}: ${message}`);
}
