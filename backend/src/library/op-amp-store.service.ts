import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { OpAmpPart } from '@roothertz/common/parts';
import type { DataSource, EntityManager } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { isDuplicateEntry } from '../shared/errors/duplicate-entry.js';
import type { List } from '../shared/list/list-response.js';
import { Library } from './entities/library.entity.js';
import { Part } from './entities/part.entity.js';
import { LibraryService } from './library.service.js';
import { type OpAmpRecord, toOpAmpRecord } from './op-amp-record.js';
import { insertOpAmps, updateOpAmp } from './op-amp-rows.js';
import { filterOpAmps, type OpAmpQuery, selectOpAmps, sortOpAmps } from './op-amp-select.js';

/** Keeps the op-amps of the libraries: each change bumps its library's revision in the same transaction. */
@Injectable()
export class OpAmpStore {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly libraries: LibraryService,
  ) {}

  async list(caller: Caller, query: OpAmpQuery): Promise<List<OpAmpRecord>> {
    const select = filterOpAmps(selectOpAmps(this.dataSource.manager, caller), query);
    const [opAmps, total] = await sortOpAmps(select, query.sort)
      .limit(query.limit)
      .offset(query.offset)
      .getManyAndCount();
    return { items: opAmps.map(toOpAmpRecord), total };
  }

  find(caller: Caller, id: number | null): Promise<OpAmpRecord> {
    return findReadable(this.dataSource.manager, caller, id);
  }

  insert(caller: Caller, part: OpAmpPart): Promise<OpAmpRecord> {
    return this.changeLibrary(caller, async (manager, libraryId) => {
      const [id] = await insertOpAmps(manager, libraryId, [part], caller.userId);
      return findReadable(manager, caller, id);
    });
  }

  update(
    caller: Caller,
    id: number | null,
    version: number,
    change: (current: OpAmpRecord) => OpAmpPart,
  ): Promise<OpAmpRecord> {
    return this.changeLibrary(caller, async (manager) => {
      const current = await findChangeable(manager, caller, id, version);
      await updateOpAmp(manager, current, change(current), caller.userId);
      return findReadable(manager, caller, id);
    });
  }

  async remove(caller: Caller, id: number | null, version: number): Promise<void> {
    await this.changeLibrary(caller, async (manager) => {
      const current = await findChangeable(manager, caller, id, version);
      await manager.delete(Part, { id: current.id });
    });
  }

  /** The bump comes first: its lock on the library lets one writer after the other see what is there. */
  private async changeLibrary<Result>(
    caller: Caller,
    change: (manager: EntityManager, libraryId: number) => Promise<Result>,
  ): Promise<Result> {
    const libraryId = await this.libraries.editableLibrary(caller);
    return this.dataSource
      .transaction(async (manager) => {
        await manager.increment(Library, { id: libraryId }, 'revision', 1);
        return change(manager, libraryId);
      })
      .catch(refuseDuplicate);
  }
}

async function findReadable(manager: EntityManager, caller: Caller, id: number | null): Promise<OpAmpRecord> {
  const opAmp = id === null ? null : await selectOpAmps(manager, caller).andWhere({ partId: id }).getOne();
  if (opAmp === null) throw new DomainError('part.not-found', 'There is no such part in your libraries.');
  return toOpAmpRecord(opAmp);
}

async function findChangeable(
  manager: EntityManager,
  caller: Caller,
  id: number | null,
  version: number,
): Promise<OpAmpRecord> {
  const current = await findReadable(manager, caller, id);
  if (current.library === 'curated')
    throw new DomainError('part.curated', 'Curated parts are shared by all teams and can’t be changed.');
  if (current.version !== version)
    throw new DomainError('part.stale', 'Somebody has changed this part meanwhile: load it again.');
  return current;
}

function refuseDuplicate(error: unknown): never {
  if (!isDuplicateEntry(error)) throw error;
  const message = 'part number: the library has this part of this manufacturer already';
  throw new DomainError('part.duplicate', 'The library has this part already.', {
    errors: [{ field: 'partNumber', message }],
  });
}
