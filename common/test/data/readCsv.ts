import { readFileSync } from 'node:fs';
import { parse } from 'csv-parse/sync';
import { readOpAmpRow, type OpAmpPart, type OpAmpRowReading } from '../../src/parts/index.js';

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
export function readRows(path: string): OpAmpRowReading[] {
  return readCsv(path).map((row) => readOpAmpRow(row));
}

/** The op-amps of a parts list below `data/`; a row that can't be read is an error. */
export function readParts(path: string): OpAmpPart[] {
  return readRows(path).map((reading) => {
    if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
    return reading.part;
  });
}
