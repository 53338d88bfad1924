import { createReadStream } from 'node:fs';
import { pipeline } from 'node:stream';
import { CsvError, type Options, parse, type Parser } from 'csv-parse';
import iconv from 'iconv-lite';
import { DomainError } from '../../shared/errors/domain-error.js';
import { type Delimiter, DELIMITER_CHARACTERS } from '../../shared/csv/csv-format.js';
import type { Dialect } from './dialect.js';

/** A row of a list with the line on which it begins. */
export interface CsvRecord {
  line: number;
  cells: string[];
}

/** What the parser gives with `info`. */
export interface ParsedRecord {
  record: string[];
  info: { lines: number };
}

const LONGEST_RECORD = 300_000;
/** In characters, so that a portion of long rows goes to the database in one piece. */
const LARGEST_PORTION = 300_000;
const LINE_BREAK = /\r\n|\n|\r/g;

/** How csv-parse is to read a list: as it comes, with rows of any length and quotes within cells. */
export function parserOptions(delimiter: Delimiter): Options {
  return {
    delimiter: DELIMITER_CHARACTERS[delimiter],
    info: true,
    max_record_size: LONGEST_RECORD,
    record_delimiter: ['\r\n', '\n', '\r'],
    relax_column_count: true,
    relax_quotes: true,
    skip_empty_lines: true,
    skip_records_with_empty_values: true,
  };
}

/** The rows of a file from its headings on, in portions, so that no more of them is in memory at once. */
async function* readRecords(path: string, dialect: Dialect, portion: number): AsyncGenerator<CsvRecord[]> {
  let records: CsvRecord[] = [];
  let size = 0;
  for await (const parsed of parsedFile<ParsedRecord>(path, dialect, true))
    for (const one of parsed) {
      const record = toRecord(one);
      if (record.line < dialect.headerLine) continue;
      records.push(record);
      for (const cell of record.cells) size += cell.length;
      if (records.length < portion && size < LARGEST_PORTION) continue;
      yield records;
      records = [];
      size = 0;
    }
  if (records.length > 0) yield records;
}

/** The rows of a file below its headings, in portions. */
export async function* readRows(
  path: string,
  dialect: Dialect,
  portion: number,
): AsyncGenerator<CsvRecord[]> {
  let isHeader = true;
  for await (const records of readRecords(path, dialect, portion)) {
    const rows = isHeader ? records.slice(1) : records;
    isHeader = false;
    if (rows.length > 0) yield rows;
  }
}

/** Counts the rows of a file, those above the headings among them, some after some. */
export async function* countRecords(path: string, dialect: Dialect): AsyncGenerator<number> {
  for await (const rows of parsedFile<string[]>(path, dialect, false)) yield rows.length;
}

/** The rows of a file, as many at once as the parser has made of a piece of it. */
async function* parsedFile<Parsed>(path: string, dialect: Dialect, info: boolean): AsyncGenerator<Parsed[]> {
  const parser = parse({ ...parserOptions(dialect.delimiter), info });
  pipeline(createReadStream(path), iconv.decodeStream(dialect.encoding), parser, () => {});
  try {
    for await (const first of parser as AsyncIterable<Parsed>) yield [first, ...readyRecords<Parsed>(parser)];
  } catch (error) {
    throw toUnreadable(error);
  }
}

function* readyRecords<Parsed>(parser: Parser): Generator<Parsed> {
  for (let record: unknown = parser.read(); record !== null; record = parser.read()) yield record as Parsed;
}

/** A quoted cell may go over several lines: the row begins before them. */
export function toRecord({ record, info }: ParsedRecord): CsvRecord {
  return { line: info.lines - breaksIn(record), cells: record };
}

function breaksIn(cells: readonly string[]): number {
  let breaks = 0;
  for (const cell of cells)
    if (cell.includes('\n') || cell.includes('\r')) breaks += cell.match(LINE_BREAK)!.length;
  return breaks;
}

function toUnreadable(error: unknown): unknown {
  if (!(error instanceof CsvError)) return error;
  const line = typeof error.lines === 'number' ? ` near line ${error.lines}` : '';
  const why =
    error.code === 'CSV_MAX_RECORD_SIZE'
      ? `A row${line} is longer than ${LONGEST_RECORD / 1000} 000 characters: was a quotation mark left open?`
      : `The rows can’t be told apart${line}: was a quotation mark left open?`;
  return new DomainError('import.unreadable', why);
}
