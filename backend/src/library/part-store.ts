import type { LibraryPart, Standing } from '@roothertz/common/parts';
import type { DataSource, EntityManager } from 'typeorm';
import type { AuditService } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { duplicateAs } from '../shared/errors/duplicate-entry.js';
import type { List } from '../shared/list/list-response.js';
import { Library } from './entities/library.entity.js';
import { Part } from './entities/part.entity.js';
import type { LibraryService } from './library.service.js';
import { type PartRecord, toPartRecord } from './part-record.js';
import { insertParts, updatePart } from './part-rows.js';
import { countGaps, type GapCounts } from './gap-counts.js';
import {
  filterParts,
  type PartFilters,
  type PartQuery,
  type PartSelect,
  selectParts,
  sortParts,
} from './part-select.js';
import {
  bringBack,
  changeMatching,
  findStandingChange,
  outcomeOf,
  type StandingOutcome,
} from './matching-standings.js';
import { idsOfChanges, restood, type StandingChange, writeStandings } from './part-standings.js';
import type { PartTable } from './part-tables.js';
import { matchingTrail, type PartChange, trailOf } from './part-trail.js';

const refuseDuplicate = duplicateAs('part.duplicate', 'The library has this part already.', [
  {
    field: 'partNumber',
    message: 'part number: the library has this part of this manufacturer already',
  },
]);

/** Keeps the parts of a kind: each change bumps its library's revision in the same transaction. */
export class PartStore<Kind extends LibraryPart> {
  constructor(
    readonly table: PartTable<Kind>,
    private readonly dataSource: DataSource,
    private readonly libraries: LibraryService,
    private readonly audit: AuditService,
  ) {}

  async list(caller: Caller, query: PartQuery): Promise<List<PartRecord<Kind>>> {
    const { catalogue } = this.table;
    const select = this.selectMatching(this.dataSource.manager, caller, query);
    const [rows, total] = await sortParts(select, catalogue, query.sort)
      .limit(query.limit)
      .offset(query.offset)
      .getManyAndCount();
    return { items: rows.map((row) => toPartRecord<Kind>(catalogue, row)), total };
  }

  /** How many of the parts lack each parameter that can be unknown, and how many lack none. */
  async countGaps(caller: Caller, query: PartFilters): Promise<GapCounts> {
    return countGaps(this.selectMatching(this.dataSource.manager, caller, query), this.table.catalogue);
  }

  find(caller: Caller, id: number | null): Promise<PartRecord<Kind>> {
    return this.findReadable(this.dataSource.manager, caller, id);
  }

  /** Those of the parts that the caller may read, by their ids as texts. */
  findMany(caller: Caller, ids: readonly number[]): Promise<Map<string, PartRecord<Kind>>> {
    return this.findAll(this.dataSource.manager, caller, ids);
  }

  insert(caller: Caller, part: Kind): Promise<PartRecord<Kind>> {
    return this.changeLibrary(caller, async (manager, libraryId) => {
      const [id] = await insertParts(manager, this.table, libraryId, [part], caller.userId);
      const created = await this.findReadable(manager, caller, id);
      await this.record(manager, caller, [[null, created]]);
      return created;
    });
  }

  update(
    caller: Caller,
    id: number | null,
    version: number,
    change: (current: PartRecord<Kind>) => Kind,
  ): Promise<PartRecord<Kind>> {
    return this.changeLibrary(caller, async (manager) => {
      const current = await this.findChangeable(manager, caller, id, version);
      await updatePart(manager, this.table, current, change(current), caller.userId);
      const changed = await this.findReadable(manager, caller, id);
      await this.record(manager, caller, [[current, changed]]);
      return changed;
    });
  }

  /** @param assertUnused refuses where something else needs the part */
  async remove(
    caller: Caller,
    id: number | null,
    version: number,
    assertUnused: (manager: EntityManager, id: number) => Promise<void>,
  ): Promise<void> {
    await this.changeLibrary(caller, async (manager) => {
      const current = await this.findChangeable(manager, caller, id, version);
      await assertUnused(manager, current.id);
      await manager.delete(Part, { id: current.id });
      await this.record(manager, caller, [[current, null]]);
    });
  }

  /** Changes how parts stand, all of them or none, and gives them in the order of the changes. */
  changeStandings(caller: Caller, changes: readonly StandingChange[]): Promise<PartRecord<Kind>[]> {
    const ids = idsOfChanges(changes);
    return this.changeLibrary(caller, async (manager) => {
      const moved = restood(changes, await this.findAll(manager, caller, ids));
      await writeStandings(manager, moved, caller.userId);
      const found = await this.findAll(manager, caller, ids);
      const named = (id: number | string) => found.get(String(id))!;
      await this.record(
        manager,
        caller,
        moved.map(({ current }) => [current, named(current.id)]),
      );
      return changes.map(({ id }) => named(id));
    });
  }

  /** What would become of all parts of a filter, said of the team's library as it is now. */
  async standingOutcome(
    caller: Caller,
    filters: PartFilters,
    wanted: Partial<Standing>,
  ): Promise<StandingOutcome & { libraryRevision: number }> {
    const libraryId = await this.libraries.editableLibrary(caller);
    const { revision } = await this.dataSource.manager.findOneByOrFail(Library, { id: libraryId });
    const select = this.selectMatching(this.dataSource.manager, caller, filters);
    return { ...(await outcomeOf(select, wanted)), libraryRevision: revision };
  }

  /** Changes how all own parts of a filter stand, or none where the library isn't the one any more of which the outcome was said. */
  changeMatching(
    caller: Caller,
    filters: PartFilters,
    { libraryRevision, ...wanted }: Partial<Standing> & { libraryRevision: number },
  ): Promise<{ id: number; changed: number }> {
    const { kind } = this.table.catalogue;
    return this.changeLibrary(caller, async (manager, libraryId) => {
      const { revision } = await manager.findOneByOrFail(Library, { id: libraryId });
      if (revision !== libraryRevision + 1)
        throw new DomainError(
          'part.library-changed',
          'Somebody has changed the library meanwhile: look again.',
        );
      const select = this.selectMatching(manager, caller, filters);
      const { id, partCount: parts } = await changeMatching(manager, caller, kind, select, wanted);
      await this.audit.record(manager, caller, [
        matchingTrail('standings.changed', kind, { id, parts }, { ...wanted, of: filters }),
      ]);
      return { id, changed: parts };
    });
  }

  /** Brings back how the parts of such a change stood; those that were changed since stay as they are. */
  undoMatching(caller: Caller, id: number | null): Promise<{ takenBack: number; kept: number }> {
    const { kind } = this.table.catalogue;
    return this.changeLibrary(caller, async (manager) => {
      const change = await findStandingChange(manager, caller, kind, id);
      const takenBack = await bringBack(manager, caller, change);
      const outcome = { takenBack, kept: change.partCount - takenBack };
      const parts = change.partCount;
      await this.audit.record(manager, caller, [
        matchingTrail('standings.undone', kind, { id: change.id, parts }, outcome),
      ]);
      return outcome;
    });
  }

  private selectMatching(manager: EntityManager, caller: Caller, filters: PartFilters): PartSelect {
    const { catalogue } = this.table;
    return filterParts(selectParts(manager, this.table, caller), catalogue, filters);
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

  private record(
    manager: EntityManager,
    caller: Caller,
    changes: readonly PartChange<Kind>[],
  ): Promise<void> {
    return this.audit.record(
      manager,
      caller,
      changes.map((change) => trailOf(this.table.catalogue.kind, change)),
    );
  }

  private async findAll(
    manager: EntityManager,
    caller: Caller,
    ids: readonly number[],
  ): Promise<Map<string, PartRecord<Kind>>> {
    if (ids.length === 0) return new Map();
    const select = selectParts(manager, this.table, caller).andWhere('part.id IN (:...ids)', { ids });
    const records = (await select.getMany()).map((row) => toPartRecord<Kind>(this.table.catalogue, row));
    return new Map(records.map((record) => [String(record.id), record]));
  }

  private async findReadable(
    manager: EntityManager,
    caller: Caller,
    id: number | null,
  ): Promise<PartRecord<Kind>> {
    const select = selectParts(manager, this.table, caller);
    const row = id === null ? null : await select.andWhere({ partId: id }).getOne();
    if (row === null) throw new DomainError('part.not-found', 'There is no such part in your libraries.');
    return toPartRecord<Kind>(this.table.catalogue, row);
  }

  private async findChangeable(
    manager: EntityManager,
    caller: Caller,
    id: number | null,
    version: number,
  ): Promise<PartRecord<Kind>> {
    const current = await this.findReadable(manager, caller, id);
    if (current.library === 'curated')
      throw new DomainError('part.curated', 'Curated parts are shared by all teams and can’t be changed.');
    if (current.version !== version)
      throw new DomainError('part.stale', 'Somebody has changed this part meanwhile: load it again.');
    return current;
  }
}
