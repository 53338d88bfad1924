import iconv from 'iconv-lite';
import { DomainError } from '../../shared/errors/domain-error.js';
import type { Import } from '../entities/import.entity.js';
import type { ImportKind } from '../import-states.js';
import { LIST_KINDS } from '../list-kinds.js';
import { countRecords } from './csv-records.js';
import { detectDialect } from './detect-dialect.js';
import type { Encoding } from '../../shared/csv/csv-format.js';
import type { Dialect, DialectChoice } from './dialect.js';
import { headerKey, importColumns, MOST_COLUMNS } from './import-columns.js';
import { inspectFile } from './text-encoding.js';

/** So many of a list's characters may be controls; a file with more is no text. */
const CONTROL_SHARE = 0.05;

/** What an import keeps of its file. */
export type ReadUpload = Pick<
  Import,
  'fileSize' | 'sha256' | 'headerKey' | 'dialect' | 'columns' | 'rowCount'
>;

/** Reads an uploaded list through once: how it is written, its columns, how many rows it has. */
export async function readUpload(
  kind: ImportKind,
  path: string,
  choice?: DialectChoice,
): Promise<ReadUpload> {
  const { columns, mostRows } = LIST_KINDS[kind];
  const facts = await inspectFile(path);
  const detected = detectDialect(columns, facts, choice);
  if (detected === null || isNoText(facts.head, detected.dialect.encoding))
    throw new DomainError('import.unreadable', 'No row can be read: is the file a text with a delimiter?');
  const { dialect, header, recordsBefore } = detected;
  if (header.cells.length > MOST_COLUMNS)
    throw new DomainError('import.unreadable', `The list has more than ${MOST_COLUMNS} columns.`);
  const rowCount = await countRows(path, dialect, { recordsBefore, mostRows });
  if (rowCount === 0)
    throw new DomainError('import.unreadable', `There is no row below the headings of line ${header.line}.`);
  return {
    fileSize: facts.size,
    sha256: facts.sha256,
    headerKey: headerKey(header.cells),
    dialect,
    columns: importColumns(columns, detected),
    rowCount,
  };
}

function isNoText(head: Buffer, encoding: Encoding): boolean {
  const text = iconv.decode(head, encoding);
  const controls = text.match(/(?![\t\r\n])[\p{Cc}\uFFFD]/gu)?.length ?? 0;
  return controls > text.length * CONTROL_SHARE;
}

async function countRows(
  path: string,
  dialect: Dialect,
  { recordsBefore, mostRows }: { recordsBefore: number; mostRows: number },
): Promise<number> {
  let count = -recordsBefore - 1;
  for await (const more of countRecords(path, dialect)) {
    count += more;
    if (count > mostRows)
      throw new DomainError(
        'import.too-large',
        `The list has more than ${mostRows / 1000} 000 rows: split it.`,
      );
  }
  return Math.max(0, count);
}
