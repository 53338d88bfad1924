import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Library as LibraryName, LibraryPart, Lifecycle } from '@roothertz/common/parts';
import { type DataSource, type EntityManager, IsNull } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { betweenOtherWork } from '../shared/in-pieces/between-other-work.js';
import { type IdentifiedPart, toComparedParts } from './compared-parts.js';
import { Library } from './entities/library.entity.js';
import { type ListedResistor, toListedResistors } from './listed-resistors.js';
import { readListedRows } from './listed-rows.js';
import { type LibraryColumns, toLibraryColumns } from './op-amp-columns.js';
import { findReadableParts, type PartName, toPartName } from './readable-parts.js';
import { OP_AMPS, type PartTable, RESISTORS } from './part-tables.js';

export interface ReadableLibrary {
  id: number;
  library: LibraryName;
  revision: number;
}

/** A part of any kind, and how long its maker will sell it. */
export type LivingPart = PartName & { lifecycle: Lifecycle };

/** Says which libraries a caller reads and which one it edits, and gives their parts to other features. */
@Injectable()
export class LibraryService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async readableLibraries({ teamId }: Pick<Caller, 'teamId'>): Promise<ReadableLibrary[]> {
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

  /** The parts of every kind that a team may read among the given ids, as a transaction sees them. */
  async findParts(
    manager: EntityManager,
    team: Pick<Caller, 'teamId'>,
    ids: readonly number[],
  ): Promise<LivingPart[]> {
    const found = await findReadableParts(manager, team, ids);
    return found.map((part) => ({ ...toPartName(part), lifecycle: part.lifecycle }));
  }

  /** The op-amps of a library that {@link readableLibraries} named, as columns; to be cached by its revision. */
  async loadOpAmpColumns(libraryId: number): Promise<LibraryColumns> {
    return toLibraryColumns(await readListedRows(this.dataSource, OP_AMPS, libraryId));
  }

  /** The parts of a library that {@link readableLibraries} named, as the search for duplicates takes them. */
  async loadComparedParts<Kind extends LibraryPart>(
    table: PartTable<Kind>,
    { id, library }: ReadableLibrary,
  ): Promise<IdentifiedPart[]> {
    const rows = await readListedRows(this.dataSource, table, id);
    return betweenOtherWork(toComparedParts(table, rows, library === 'team'));
  }

  /** The resistors of a library that {@link readableLibraries} named; to be cached by its revision. */
  async loadResistors({ id, library }: ReadableLibrary): Promise<ListedResistor[]> {
    return toListedResistors(await readListedRows(this.dataSource, RESISTORS, id), library);
  }
}
