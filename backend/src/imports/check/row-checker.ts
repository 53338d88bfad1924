import {
  type ImportRowReader,
  importRowReader,
  type PartValue,
  type RowError,
  rowJudge,
  type RowVerdict,
} from '@roothertz/common/imports';
import { type LibraryPart, normalisePartKey, type PartCatalogue } from '@roothertz/common/parts';
import type { FoundPart } from '../../library/bulk-parts.js';
import type { Import } from '../entities/import.entity.js';
import type { CsvRecord } from '../file/csv-records.js';
import { type PartUses, useRemark } from './use-remark.js';

type Reading = ReturnType<ImportRowReader['read']>;

/** A row whose cells are read, before anything is known of the libraries. */
export interface ReadRow {
  record: CsvRecord;
  reading: Reading;
  key: string | null;
}

/** A row with its verdict; what stands in the library of its part. */
export interface CheckedRow {
  record: CsvRecord;
  key: string | null;
  verdict: RowVerdict<LibraryPart>;
  existing: FoundPart<LibraryPart> | null;
}

interface Seen {
  line: number;
  /** The fingerprint of what it says of the part besides its names. */
  said: number;
}

const NAMES = new Set(['manufacturer', 'partNumber']);
const FIRST_HASH = 0x811c9dc5;
const PRIME = 0x01000193;
const DOUBLE = new Float64Array(1);
const DOUBLE_BITS = new Uint32Array(DOUBLE.buffer);

/** Checks the rows of one list, which it remembers by their keys. */
export class RowChecker {
  private readonly reader: ImportRowReader;
  private readonly judge: ReturnType<typeof rowJudge<LibraryPart>>;
  private readonly seen = new Map<string, Seen>();

  constructor(
    catalogue: PartCatalogue<LibraryPart>,
    { mapping, dialect }: Pick<Import, 'mapping' | 'dialect'>,
    private readonly ownLibraryId: number,
    private readonly uses: PartUses,
  ) {
    this.reader = importRowReader(catalogue, mapping ?? [], dialect.decimalMark);
    this.judge = rowJudge(catalogue, this.reader);
  }

  read(record: CsvRecord): ReadRow {
    const reading = this.reader.read(record.cells);
    return { record, reading, key: reading.ok ? keyOf(reading) : null };
  }

  check({ record, reading, key }: ReadRow, found: readonly FoundPart<LibraryPart>[]): CheckedRow {
    if (!reading.ok) return refused(record, key, reading.errors);
    const existing = found.find(({ libraryId }) => libraryId === this.ownLibraryId) ?? null;
    const curated = found.find(({ libraryId }) => libraryId !== this.ownLibraryId)?.part ?? null;
    if (existing !== null && existing.part === null)
      return this.refuseAt(record, reading, key, 'the library has a part of another kind by this name');
    const before = key === null ? undefined : this.seen.get(key);
    const said = fingerprint(reading.stated);
    if (before !== undefined) return this.checkAgain(record, reading, key!, before, said, existing);
    const verdict = this.judge(reading, { existing: existing?.part ?? null, curated });
    if (key !== null && verdict.state !== 'refused') this.seen.set(key, { line: record.line, said });
    return { record, key, verdict: this.remarked(verdict, existing), existing };
  }

  private remarked(
    verdict: RowVerdict<LibraryPart>,
    existing: FoundPart<LibraryPart> | null,
  ): RowVerdict<LibraryPart> {
    if (existing === null || verdict.state === 'refused' || verdict.state === 'unchanged') return verdict;
    const remark = useRemark(this.uses, existing.id);
    return remark.length === 0 ? verdict : { ...verdict, doubts: [...verdict.doubts, ...remark] };
  }

  /** The part stands in the file before. */
  private checkAgain(
    record: CsvRecord,
    reading: Extract<Reading, { ok: true }>,
    key: string,
    { line, said: before }: Seen,
    said: number,
    existing: FoundPart<LibraryPart> | null,
  ): CheckedRow {
    if (said !== before)
      return this.refuseAt(record, reading, key, `stands on line ${line} too, with other values`);
    const part = Object.fromEntries(reading.stated) as unknown as LibraryPart;
    const doubts = [{ code: 'repeated' as const, field: null, message: `the same as line ${line}` }];
    return { record, key, verdict: { state: 'unchanged', part, doubts }, existing };
  }

  private refuseAt(
    record: CsvRecord,
    { cells }: Extract<Reading, { ok: true }>,
    key: string | null,
    why: string,
  ): CheckedRow {
    const error = this.reader.errorAt('partNumber', why, cells);
    return refused(record, key, [{ ...error, expected: 'each part once' }]);
  }
}

/** A number that tells rows of one part from each other by their values, whatever way its names are written. */
function fingerprint(stated: ReadonlyMap<string, PartValue>): number {
  let hash = FIRST_HASH;
  for (const [path, value] of stated) {
    if (NAMES.has(path)) continue;
    hash = hashed(hash, path);
    hash = typeof value === 'number' ? hashedNumber(hash, value) : hashed(hash, value ?? '');
  }
  return hash;
}

function hashedNumber(before: number, value: number): number {
  DOUBLE[0] = value;
  return Math.imul(Math.imul(before ^ DOUBLE_BITS[0], PRIME) ^ DOUBLE_BITS[1], PRIME);
}

/** One more text in a hash of FNV-1a. */
function hashed(before: number, text: string): number {
  let hash = before;
  for (let index = 0; index < text.length; index += 1) hash = Math.imul(hash ^ text.charCodeAt(index), PRIME);
  return Math.imul(hash ^ 0xffff, PRIME);
}

function refused(record: CsvRecord, key: string | null, errors: RowError[]): CheckedRow {
  return { record, key, verdict: { state: 'refused', errors }, existing: null };
}

function keyOf({ stated }: Extract<Reading, { ok: true }>): string | null {
  const [manufacturer, partNumber] = [stated.get('manufacturer'), stated.get('partNumber')];
  return manufacturer && partNumber ? normalisePartKey(String(manufacturer), String(partNumber)) : null;
}
