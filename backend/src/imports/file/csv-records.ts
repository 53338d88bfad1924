import { createReadStream } from 'node:fs';
import { pipeline } from 'node:stream';
import { CsvError, type Options, parse } from 'csv-parse';
import iconv from 'iconv-lite';
import { DomainError } from '../../shared/errors/domain-error.js';
import { type Delimiter, DELIMITER_CHARACTERS, type Dialect } from './dialect.js';

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

const LONGEST_RECORD = 500_000;
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
export async function* readRecords(
  path: string,
  dialect: Dialect,
  portion: number,
): AsyncGenerator<CsvRecord[]> {
  const parser = parse(parserOptions(dialect.delimiter));
  pipeline(createReadStream(path), iconv.decodeStream(dialect.encoding), parser, () => {});
  let records: CsvRecord[] = [];
  try {
    for await (const parsed of parser as AsyncIterable<ParsedRecord>) {
      const record = toRecord(parsed);
      if (record.line < dialect.headerLine) continue;
      records.push(record);
      if (records.length < portion) continue;
      yield records;
      records = [];
    }
  } catch (error) {
    throw toUnreadable(error);
  }
  if (records.length > 0) yield records;
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
