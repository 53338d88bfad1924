import { harmlessUnknownCell } from '@roothertz/common/imports';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type FindOptionsWhere, MoreThan } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { parseSort } from '../shared/list/sort.js';
import { type ImportRowListDto, type ListImportRowsDto, toImportRow } from './dto/import-rows.dto.js';
import type { Import } from './entities/import.entity.js';
import { ImportRow } from './entities/import-row.entity.js';
import { csvLine, encoderOf, inEncoding, type WrittenList } from './file/csv-lines.js';
import { findImport } from './import-select.js';

const PORTION = 1000;
const REASONS = ['line of the file', 'why refused', 'what was needed'];

/** The rows of an import with their verdicts. */
@Injectable()
export class ImportRowsService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async list(caller: Caller, id: string, query: ListImportRowsDto): Promise<ImportRowListDto> {
    const { descending } = parseSort(query.sort ?? 'line', ['line']);
    const { id: importId, columns } = await findImport(this.dataSource.manager, caller, id);
    const { state, limit, offset } = query;
    const where: FindOptionsWhere<ImportRow> = { importId };
    if (state === 'kept') where.kept = 1;
    else if (state !== undefined) where.state = state;
    const [rows, total] = await this.dataSource.getRepository(ImportRow).findAndCount({
      where,
      order: { position: descending ? 'DESC' : 'ASC' },
      take: limit,
      skip: offset,
    });
    return { items: rows.map((row) => toImportRow(row, columns)), total };
  }

  /** The refused rows as they stood in the file, in its dialect, with the reasons behind them. */
  async refusedList(caller: Caller, id: string): Promise<WrittenList> {
    const entity = await findImport(this.dataSource.manager, caller, id);
    return { name: `refused ${entity.fileName}`, pieces: this.refusedPieces(entity) };
  }

  private async *refusedPieces({ id: importId, columns, dialect }: Import): AsyncGenerator<Buffer> {
    const encode = encoderOf(dialect);
    const headings = columns.map(({ heading }) => heading);
    yield encode.first(csvLine([...headings, ...REASONS], dialect.delimiter));
    for (let last = 0; ;) {
      const rows = await this.dataSource.getRepository(ImportRow).find({
        where: { importId, state: 'refused', position: MoreThan(last) },
        order: { position: 'ASC' },
        take: PORTION,
      });
      if (rows.length === 0) return;
      const lines = rows.map((row) =>
        csvLine(
          [...paddedCells(row, columns.length), ...reasonsOf(row, columns, dialect)],
          dialect.delimiter,
        ),
      );
      yield encode.next(lines.join(''));
      last = rows.at(-1)!.position;
    }
  }
}

/** As many cells as the list has columns, so that the reasons stand under their headings. */
function paddedCells({ cells }: ImportRow, width: number): string[] {
  return Array.from({ length: width }, (_, index) => harmlessUnknownCell(cells?.[index] ?? ''));
}

function reasonsOf(
  { line, errors }: ImportRow,
  columns: Import['columns'],
  { encoding }: Import['dialect'],
): string[] {
  const all = errors ?? [];
  const why = all.map((error) => {
    const heading = error.column === null ? undefined : columns[error.column]?.heading;
    return heading ? `${heading}: ${error.why}` : error.why;
  });
  const expected = new Set(all.map((error) => error.expected).filter((text) => text !== ''));
  return [String(line), why.join('; '), [...expected].join('; ')].map((text) => inEncoding(text, encoding));
}
