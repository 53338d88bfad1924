import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type Library as LibraryName } from '@roothertz/common/parts';
import { type DataSource, IsNull } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { Library } from './entities/library.entity.js';
import { type LibraryColumns, readLibraryColumns } from './op-amp-columns.js';
import { type OpAmpRecord, toOpAmpRecord } from './op-amp-record.js';
import { selectOpAmps } from './op-amp-select.js';

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
    const found = await selectOpAmps(this.dataSource.manager, caller)
      .andWhere('part.id IN (:...ids)', { ids })
      .getMany();
    const records = new Map(found.map((opAmp) => [opAmp.partId, toOpAmpRecord(opAmp)]));
    return ids.flatMap((id) => records.get(id) ?? []);
  }

  /** The op-amps of a library that {@link readableLibraries} named, as columns; to be cached by its revision. */
  loadOpAmpColumns(libraryId: number): Promise<LibraryColumns> {
    return readLibraryColumns(this.dataSource, libraryId);
  }
}
