import { readFileSync } from 'node:fs';
import { parse } from 'csv-parse/sync';
import {
  OP_AMP_CATALOGUE,
  readPartRow,
  RESISTOR_CATALOGUE,
  type LibraryPart,
  type OpAmpPart,
  type PartCatalogue,
  type PartRowReading,
  type ResistorPart,
} from '../../src/parts/index.js';

export type CsvRow = Record<string, string>;

/** The text of a file below `data/`. */
export function readData(path: string): string {
  return readFileSync(new URL(`../../../data/${path}`, import.meta.url), 'utf8');
}

/** The rows of a CSV file below `data/`, heading → cell. */
export function readCsv(path: string): CsvRow[] {
  return parse<CsvRow>(readData(path), { columns: true });
}

/** What the rows of a parts list below `data/` read as, parts and errors. */
export function readRows<Part extends LibraryPart>(
  catalogue: PartCatalogue<Part>,
  path: string,
): PartRowReading<Part>[] {
  return readCsv(path).map((row) => readPartRow(catalogue, row));
}

/** The op-amps of a list below `data/`; a row that can't be read is an error. */
export function readOpAmps(path: string): OpAmpPart[] {
  return readRows(OP_AMP_CATALOGUE, path).map(partOf);
}

/** The resistors of a list below `data/`; a row that can't be read is an error. */
export function readResistors(path: string): ResistorPart[] {
  return readRows(RESISTOR_CATALOGUE, path).map(partOf);
}

function partOf<Part>(reading: PartRowReading<Part>): Part {
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return reading.part;
}
