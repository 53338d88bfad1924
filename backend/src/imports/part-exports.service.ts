import { type ExportColumn, exportColumns } from '@roothertz/common/imports';
import type { LibraryPart } from '@roothertz/common/parts';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { selectParts } from '../library/part-select.js';
import { toPartRecord } from '../library/part-record.js';
import type { PartTable } from '../library/part-tables.js';
import type { Caller } from '../shared/access/caller.js';
import type { ExportQueryDto } from './dto/export-query.dto.js';
import { csvLine, encoderOf, type WrittenList } from '../shared/csv/csv-lines.js';
import type { PartListKind } from './import-states.js';
import { tableOf } from './list-kinds.js';

const PORTION = 1000;

/** Writes a team's own library as a list that an import reads back. */
@Injectable()
export class PartExports {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  export(caller: Caller, kind: PartListKind, query: ExportQueryDto): WrittenList {
    return { name: `${kind}.csv`, pieces: this.pieces(caller, tableOf(kind), query) };
  }

  private async *pieces(
    caller: Caller,
    table: PartTable<LibraryPart>,
    { delimiter, decimalMark }: ExportQueryDto,
  ): AsyncGenerator<Buffer> {
    const encode = encoderOf({ encoding: 'utf-8', byteOrderMark: true });
    const columns = exportColumns<LibraryPart>(table.catalogue, decimalMark);
    yield encode.first(
      csvLine(
        columns.map(({ heading }) => heading),
        delimiter,
      ),
    );
    for (let last = 0; ;) {
      const rows = await selectParts(this.dataSource.manager, table, caller)
        .andWhere('library.teamId IS NOT NULL')
        .andWhere('part.id > :last', { last })
        .orderBy('part.id')
        .limit(PORTION)
        .getMany();
      if (rows.length === 0) return;
      const parts = rows.map((row) => toPartRecord<LibraryPart>(table.catalogue, row));
      yield encode.next(parts.map((part) => csvLine(cellsOf(columns, part), delimiter)).join(''));
      last = rows.at(-1)!.partId;
    }
  }
}

function cellsOf(columns: readonly ExportColumn<LibraryPart>[], part: LibraryPart): string[] {
  return columns.map((column) => column.cell(part));
}
