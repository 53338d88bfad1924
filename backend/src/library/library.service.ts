import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Library as LibraryName, OpAmpPart } from '@roothertz/common/parts';
import { type DataSource, IsNull } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { Library } from './entities/library.entity.js';
import { type ListedResistor, toListedResistors } from './listed-resistors.js';
import { readListedRows } from './listed-rows.js';
import { type LibraryColumns, toLibraryColumns } from './op-amp-columns.js';
import { type OpAmpRecord, toPartRecord } from './part-record.js';
import { selectParts } from './part-select.js';
import { OP_AMPS, RESISTORS } from './part-tables.js';

export interface ReadableLibrary {
  id: number;
  library: LibraryName;
  revision: number;
}

/** Says which libraries a caller reads and which one it edits, and gives their parts to other features. */
@Injectable()
export class LibraryService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async readableLibraries({ teamId }: Caller): Promise<ReadableLibrary[]> {
    const libraries = await this.dataSource
      .getRepository(Library)
      .find({ where: [{ teamId: IsNull() }, { teamId }], order: { id: 'ASC' } });
    return libraries.map(({ id, teamId: owner, revision }) => ({
      id,
      library: owner === null ? 'curated' : 'team',
      revision,
    }));
  }

  /** The id of the team's own library, which is made when it is first needed. */
  async editableLibrary({ teamId }: Caller): Promise<number> {
    const libraries = this.dataSource.getRepository(Library);
    const own = await libraries.findOneBy({ teamId });
    if (own !== null) return own.id;
    await libraries.createQueryBuilder().insert().values({ teamId }).orIgnore().execute();
    return (await libraries.findOneByOrFail({ teamId })).id;
  }

  /** The op-amps that the caller may read among the given ids, in the order of the ids. */
  async findOpAmps(caller: Caller, ids: readonly number[]): Promise<OpAmpRecord[]> {
    if (ids.length === 0) return [];
    const found = await selectParts(this.dataSource.manager, OP_AMPS, caller)
      .andWhere('part.id IN (:...ids)', { ids })
      .getMany();
    const records = new Map(
      found.map((row) => [row.partId, toPartRecord<OpAmpPart>(OP_AMPS.catalogue, row)]),
    );
    return ids.flatMap((id) => records.get(id) ?? []);
  }

  /** The op-amps of a library that {@link readableLibraries} named, as columns; to be cached by its revision. */
  async loadOpAmpColumns(libraryId: number): Promise<LibraryColumns> {
    return toLibraryColumns(await readListedRows(this.dataSource, OP_AMPS, libraryId));
  }

  /** The resistors of a library that {@link readableLibraries} named; to be cached by its revision. */
  async loadResistors({ id, library }: ReadableLibrary): Promise<ListedResistor[]> {
    return toListedResistors(await readListedRows(this.dataSource, RESISTORS, id), library);
  }
}
