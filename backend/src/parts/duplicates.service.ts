import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import {
  type DuplicateReason,
  type LibraryPart,
  type PartKind,
  searchDuplicates,
} from '@roothertz/common/parts';
import type { DataSource } from 'typeorm';
import { AuditService, type Recorded } from '../audit/audit.service.js';
import { LibraryService, type ReadableLibrary } from '../library/library.service.js';
import type { PartTable } from '../library/part-tables.js';
import { findReadableParts } from '../library/readable-parts.js';
import { RevisionCache } from '../library/revision-cache.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { betweenOtherWork } from '../shared/in-pieces/between-other-work.js';
import { readId } from '../shared/ids/read-id.js';
import type { List } from '../shared/list/list-response.js';
import type { PartPairDto } from './dto/part-pair.dto.js';
import { KeptPair } from './entities/kept-pair.entity.js';

/** Two parts that may be one, by their ids. */
export interface FoundPair {
  oneId: number;
  otherId: number;
  reasons: DuplicateReason[];
  likelihood: number;
}

/** Two parts with what the trail calls them. */
interface NamedPair {
  ids: { oneId: number; otherId: number };
  label: string;
}

/** What the search depends on: it is done anew when one of the libraries has changed. */
interface Searched {
  id: number;
  revision: string;
  libraries: readonly ReadableLibrary[];
}

/** Finds parts that may be one, and remembers which of them a team keeps both. */
@Injectable()
export class DuplicatesService {
  private readonly found = new Map<PartKind, RevisionCache<FoundPair[], Searched>>();

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly libraries: LibraryService,
    private readonly audit: AuditService,
  ) {}

  async list<Kind extends LibraryPart>(
    caller: Caller,
    table: PartTable<Kind>,
    { limit, offset }: { limit: number; offset: number },
  ): Promise<List<FoundPair>> {
    const libraries = await this.libraries.readableLibraries(caller);
    const own = libraries.find(({ library }) => library === 'team');
    if (own === undefined) return { items: [], total: 0 };
    const revision = libraries.map((library) => `${library.id}.${library.revision}`).join('-');
    const pairs = await this.cacheOf(table).contentOf({ id: own.id, revision, libraries });
    const kept = await this.keptBy(caller);
    const open = pairs.filter((pair) => !kept.has(keyOf(pair)));
    return { items: open.slice(offset, offset + limit), total: open.length };
  }

  async keepBoth(caller: Caller, dto: PartPairDto): Promise<void> {
    const pair = await this.readablePair(caller, dto);
    const decided = { teamId: caller.teamId, ...pair.ids, decidedAt: new Date(), decidedById: caller.userId };
    await this.dataSource.transaction(async (manager) => {
      if (await manager.existsBy(KeptPair, { teamId: caller.teamId, ...pair.ids })) return;
      await manager.createQueryBuilder().insert().into(KeptPair).values(decided).orIgnore().execute();
      await this.audit.record(manager, caller, [recordOf('pair.kept', pair)]);
    });
  }

  async askAgain(caller: Caller, dto: PartPairDto): Promise<void> {
    const pair = await this.readablePair(caller, dto);
    await this.dataSource.transaction(async (manager) => {
      const { affected } = await manager.delete(KeptPair, { teamId: caller.teamId, ...pair.ids });
      if (affected !== 0) await this.audit.record(manager, caller, [recordOf('pair.asked-again', pair)]);
    });
  }

  private cacheOf<Kind extends LibraryPart>(table: PartTable<Kind>): RevisionCache<FoundPair[], Searched> {
    const { kind } = table.catalogue;
    const cache = this.found.get(kind) ?? new RevisionCache((searched) => this.search(table, searched));
    this.found.set(kind, cache);
    return cache;
  }

  private async search<Kind extends LibraryPart>(
    table: PartTable<Kind>,
    { libraries }: Searched,
  ): Promise<FoundPair[]> {
    const loaded = libraries.map((library) => this.libraries.loadComparedParts(table, library));
    const parts = (await Promise.all(loaded)).flat();
    const pairs = await betweenOtherWork(searchDuplicates(parts));
    return pairs.map(({ one, other, reasons, likelihood }) => ({
      oneId: parts[one].id,
      otherId: parts[other].id,
      reasons,
      likelihood,
    }));
  }

  private async keptBy({ teamId }: Caller): Promise<Set<string>> {
    const kept = await this.dataSource.manager.findBy(KeptPair, { teamId });
    return new Set(kept.map(keyOf));
  }

  private async readablePair(caller: Caller, dto: PartPairDto): Promise<NamedPair> {
    const [oneId, otherId] = [readId(dto.oneId)!, readId(dto.otherId)!];
    const found = await findReadableParts(this.dataSource.manager, caller, [oneId, otherId]);
    const [one, other] = [oneId, otherId].map((id) => found.find((part) => part.id === id));
    if (one === undefined || other === undefined)
      throw new DomainError('part.not-found', 'There is no such part in your libraries.');
    const label = [one, other].map(({ manufacturer, partNumber }) => `${manufacturer} ${partNumber}`);
    if (oneId !== otherId) return { ids: ordered(oneId, otherId), label: label.join(' and ') };
    throw new DomainError('request.invalid', 'A part can’t be its own duplicate.', {
      errors: [{ field: 'otherId', message: 'another part was expected' }],
    });
  }
}

function recordOf(action: 'pair.kept' | 'pair.asked-again', { ids, label }: NamedPair): Recorded {
  return { action, object: { kind: 'pair', id: keyOf(ids), label }, from: null, to: null };
}

function ordered(oneId: number, otherId: number): { oneId: number; otherId: number } {
  return { oneId: Math.min(oneId, otherId), otherId: Math.max(oneId, otherId) };
}

function keyOf(pair: { oneId: number; otherId: number }): string {
  const { oneId, otherId } = ordered(pair.oneId, pair.otherId);
  return `${oneId} ${otherId}`;
}
