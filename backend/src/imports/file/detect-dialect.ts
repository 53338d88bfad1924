import type { ListColumns } from '@roothertz/common/imports';
import { parse } from 'csv-parse/sync';
import iconv from 'iconv-lite';
import { type CsvRecord, type ParsedRecord, parserOptions, toRecord } from './csv-records.js';
import { type Delimiter, DELIMITERS } from '../../shared/csv/csv-format.js';
import { decimalMarkOf } from './decimal-mark.js';
import type { Dialect, DialectChoice } from './dialect.js';
import type { FileFacts } from './text-encoding.js';

const SAMPLE_RECORDS = 100;
const HEADER_WITHIN = 20;
/** A number alone may head a column of prices, but it doesn't tell headings from other rows. */
const LETTER = /\p{L}/u;

/** A list's dialect as it was detected, where it isn't overruled, with the first rows from the headings on. */
export interface DetectedDialect {
  dialect: Dialect;
  header: CsvRecord;
  sample: CsvRecord[];
  /** How many rows stand above the headings. */
  recordsBefore: number;
}

/** Detects how a list is written; null where not one row can be read. */
export function detectDialect(
  columns: ListColumns,
  facts: FileFacts,
  choice: DialectChoice = {},
): DetectedDialect | null {
  const encoding = choice.encoding ?? facts.encoding;
  const text = iconv.decode(facts.head, encoding);
  const propose = columns.proposer();
  const known = rememberedTest((heading) => LETTER.test(heading) && propose(heading) !== null);
  const candidates = choice.delimiter === undefined ? DELIMITERS : [choice.delimiter];
  const [best] = candidates
    .map((delimiter) => readAs(text, delimiter, known, choice.headerLine))
    .filter((candidate) => candidate !== null)
    .sort((one, other) => other.known - one.known || other.evenness - one.evenness);
  if (best === undefined) return null;
  const { delimiter, header, sample, recordsBefore } = best;
  const decimalMark = choice.decimalMark ?? markOf(sample, delimiter);
  const { byteOrderMark } = facts;
  return {
    dialect: { encoding, byteOrderMark, delimiter, decimalMark, headerLine: header.line },
    header,
    sample,
    recordsBefore,
  };
}

interface Candidate extends Omit<DetectedDialect, 'dialect'> {
  delimiter: Delimiter;
  /** How many headings mean something. */
  known: number;
  /** How many columns the rows have, less where they differ in it. */
  evenness: number;
}

function readAs(
  text: string,
  delimiter: Delimiter,
  known: (heading: string) => boolean,
  headerLine: number | undefined,
): Candidate | null {
  const records = sampleRecords(text, delimiter);
  const knownIn = ({ cells }: CsvRecord) => new Set(cells.filter(known)).size;
  const header =
    headerLine === undefined
      ? findHeader(records.slice(0, HEADER_WITHIN), knownIn)
      : records.find(({ line }) => line >= headerLine);
  if (header === undefined) return null;
  const recordsBefore = records.indexOf(header);
  const sample = records.slice(recordsBefore + 1);
  const evenness = evennessOf([header, ...sample]);
  return { delimiter, header, sample, recordsBefore, known: knownIn(header), evenness };
}

/** The first of the rows whose cells mean most; where none means anything, the first of the usual width. */
function findHeader(
  records: readonly CsvRecord[],
  knownIn: (record: CsvRecord) => number,
): CsvRecord | undefined {
  const most = Math.max(0, ...records.map(knownIn));
  const width = usualWidth(records);
  return records.find((record) => (most > 0 ? knownIn(record) === most : record.cells.length === width));
}

/** The first rows; the text may be cut off within the last one. */
function sampleRecords(text: string, delimiter: Delimiter): CsvRecord[] {
  const records: CsvRecord[] = [];
  const keep = (parsed: unknown) => {
    records.push(toRecord(parsed as ParsedRecord));
    return null;
  };
  try {
    parse(text, { ...parserOptions(delimiter), to: SAMPLE_RECORDS, on_record: keep });
  } catch {
    return records;
  }
  return records;
}

function usualWidth(records: readonly CsvRecord[]): number {
  const counts = new Map<number, number>();
  for (const { cells } of records) counts.set(cells.length, (counts.get(cells.length) ?? 0) + 1);
  const [[width] = [0]] = [...counts].sort(([, one], [, other]) => other - one);
  return width;
}

function evennessOf(records: readonly CsvRecord[]): number {
  const width = usualWidth(records);
  const share = records.filter(({ cells }) => cells.length === width).length / Math.max(1, records.length);
  return (width - 1) * share ** 2;
}

function markOf(sample: readonly CsvRecord[], delimiter: Delimiter) {
  return decimalMarkOf(
    sample.flatMap(({ cells }) => cells),
    delimiter,
  );
}

function rememberedTest(test: (text: string) => boolean): (text: string) => boolean {
  const results = new Map<string, boolean>();
  return (text) => {
    const result = results.get(text) ?? (text.length <= 200 && test(text));
    results.set(text, result);
    return result;
  };
}
