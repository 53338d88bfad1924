import { harmlessUnknownCell } from '@roothertz/common/imports';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, In } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { parseSort } from '../shared/list/sort.js';
import { type ImportRowListDto, type ListImportRowsDto, toImportRow } from './dto/import-rows.dto.js';
import type { Import } from './entities/import.entity.js';
import { ImportPortion } from './entities/import-portion.entity.js';
import { REASONS } from './file/import-columns.js';
import { csvLine, encoderOf, inEncoding, type WrittenList } from '../shared/csv/csv-lines.js';
import { findImport } from './import-select.js';
import { type CountedPortion, pageOf } from './row-page.js';
import { standsIn, type StoredRow } from './stored-row.js';

/** The rows of an import with their verdicts. */
@Injectable()
export class ImportRowsService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async list(caller: Caller, id: string, query: ListImportRowsDto): Promise<ImportRowListDto> {
    const { descending } = parseSort(query.sort ?? 'line', ['line']);
    const entity = await findImport(this.dataSource.manager, caller, id);
    const { id: importId } = entity;
    const counted = await this.portionsOf(importId);
    const page = pageOf(descending ? counted.reverse() : counted, query);
    const portions = await this.dataSource
      .getRepository(ImportPortion)
      .find({ where: { importId, portion: In(page.portions) }, order: { portion: 'ASC' } });
    const rows = portions.flatMap((portion) => portion.rows).filter((row) => standsIn(row, query.state));
    const shown = (descending ? rows.reverse() : rows).slice(page.skipped, page.skipped + query.limit);
    return { items: shown.map((row) => toImportRow(row, entity)), total: page.total };
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
    const portions = (await this.portionsOf(importId)).filter(({ counts }) => counts.refused > 0);
    for (const { portion } of portions) {
      const { rows } = await this.dataSource
        .getRepository(ImportPortion)
        .findOneByOrFail({ importId, portion });
      const lines = rows
        .filter((row) => standsIn(row, 'refused'))
        .map((row) =>
          csvLine(
            [...paddedCells(row, columns.length), ...reasonsOf(row, columns, dialect)],
            dialect.delimiter,
          ),
        );
      yield encode.next(lines.join(''));
    }
  }

  private portionsOf(importId: number): Promise<CountedPortion[]> {
    return this.dataSource.getRepository(ImportPortion).find({
      select: { importId: true, portion: true, counts: true },
      where: { importId },
      order: { portion: 'ASC' },
    });
  }
}

/** As many cells as the list has columns, so that the reasons stand under their headings. */
function paddedCells({ cells }: StoredRow, width: number): string[] {
  return Array.from({ length: width }, (_, index) => harmlessUnknownCell(cells?.[index] ?? ''));
}

function reasonsOf(
  { line, errors = [] }: StoredRow,
  columns: Import['columns'],
  { encoding }: Import['dialect'],
): string[] {
  const why = errors.map((error) => {
    const heading = error.column === null ? undefined : columns[error.column]?.heading;
    return heading ? `${heading}: ${error.why}` : error.why;
  });
  const expected = new Set(errors.map((error) => error.expected).filter((text) => text !== ''));
  return [String(line), why.join('; '), [...expected].join('; ')].map((text) => inEncoding(text, encoding));
}
