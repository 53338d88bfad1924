import type { Library, LibraryPart, PartFields } from '@roothertz/common/parts';
import type { PartRecord } from '../library/part-record.js';
import { type PartFilters, type PartQuery, partSorts } from '../library/part-select.js';
import type { StandingChange } from '../library/part-standings.js';
import type { PartStore } from '../library/part-store.js';
import type { Caller } from '../shared/access/caller.js';
import { readId } from '../shared/ids/read-id.js';
import type { List } from '../shared/list/list-response.js';
import { parseSort } from '../shared/list/sort.js';
import type { UpdatePartDto } from './dto/update-part.dto.js';
import type { Duplicate } from './dto/duplicate-response.dto.js';
import type {
  ChangeMatchingDto,
  MatchingChangedDto,
  StandingOutcomeDto,
  StandingsBackDto,
  WantedStandingDto,
} from './dto/matching-standings.dto.js';
import type { ListDuplicatesDto } from './dto/list-duplicates.dto.js';
import type { DuplicatesService } from './duplicates.service.js';
import type { PartUsesService } from './part-uses.service.js';
import { changedPart, newPart } from './part-draft.js';

type Answer<Kind extends LibraryPart> = Kind & {
  id: string;
  library: Library;
  version: number;
  updatedAt: string;
};

/** What the API does with parts of a kind. */
export class PartsService<Kind extends LibraryPart> {
  constructor(
    protected readonly store: PartStore<Kind>,
    private readonly uses: PartUsesService,
    private readonly duplicates: DuplicatesService,
  ) {}

  async find(caller: Caller, id: string): Promise<Answer<Kind>> {
    return toAnswer(await this.store.find(caller, readId(id)));
  }

  async create(caller: Caller, dto: PartFields & Pick<Kind, 'origins'>): Promise<Answer<Kind>> {
    return toAnswer(await this.store.insert(caller, newPart(this.store.table.catalogue, dto)));
  }

  async update(caller: Caller, id: string, { version, ...change }: UpdatePartDto): Promise<Answer<Kind>> {
    const record = await this.store.update(caller, readId(id), version, (current) =>
      changedPart(this.store.table.catalogue, current as Kind, change),
    );
    return toAnswer(record);
  }

  async changeStandings(caller: Caller, changes: readonly StandingChange[]): Promise<List<Answer<Kind>>> {
    const records = await this.store.changeStandings(caller, changes);
    return { items: records.map((record) => toAnswer(record)), total: records.length };
  }

  standingOutcome(
    caller: Caller,
    filters: PartFilters,
    { toLifecycle: lifecycle, toApproval: approval }: WantedStandingDto,
  ): Promise<StandingOutcomeDto> {
    return this.store.standingOutcome(caller, filters, { lifecycle, approval });
  }

  async changeMatching(
    caller: Caller,
    filters: PartFilters,
    dto: ChangeMatchingDto,
  ): Promise<MatchingChangedDto> {
    const { id, changed } = await this.store.changeMatching(caller, filters, dto);
    return { id: String(id), changed };
  }

  undoMatching(caller: Caller, id: string): Promise<StandingsBackDto> {
    return this.store.undoMatching(caller, readId(id));
  }

  remove(caller: Caller, id: string, version: number): Promise<void> {
    return this.store.remove(caller, readId(id), version, (manager, part) =>
      this.uses.assertUnused(manager, caller, part),
    );
  }

  /** The pairs of parts that may be one; in each the team's own comes first. */
  async listDuplicates(caller: Caller, page: ListDuplicatesDto): Promise<List<Duplicate<Answer<Kind>>>> {
    const { items: pairs, total } = await this.duplicates.list(caller, this.store.table, page);
    const ids = [...new Set(pairs.flatMap(({ oneId, otherId }) => [oneId, otherId]))];
    const found = await this.store.findMany(caller, ids);
    const items = pairs.flatMap(({ oneId, otherId, reasons, likelihood }) => {
      const parts = [oneId, otherId].flatMap((id) => found.get(String(id)) ?? []).map(toAnswer<Kind>);
      const [one, other] = parts.sort((left, right) => rankOf(left) - rankOf(right));
      return other === undefined ? [] : [{ likelihood, reasons, one, other }];
    });
    return { items, total };
  }

  protected async listParts(
    caller: Caller,
    { sort: stated = 'manufacturer', ...query }: Omit<PartQuery, 'sort'> & { sort?: string },
  ): Promise<List<Answer<Kind>>> {
    const sort = parseSort(stated, partSorts(this.store.table.catalogue));
    const { items, total } = await this.store.list(caller, { ...query, sort });
    return { items: items.map((record) => toAnswer(record)), total };
  }
}

function rankOf({ library }: { library: Library }): number {
  return library === 'team' ? 0 : 1;
}

function toAnswer<Kind extends LibraryPart>(record: PartRecord<Kind>): Answer<Kind> {
  return { ...record, id: String(record.id), updatedAt: record.updatedAt.toISOString() };
}
