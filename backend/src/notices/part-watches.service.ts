import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { PartUse } from '../conditions/conditions-parts.js';
import { ConditionsService } from '../conditions/conditions.service.js';
import { LibraryService, type LivingPart } from '../library/library.service.js';
import { QuantityPrices } from '../prices/price-book.js';
import { PriceBookService } from '../prices/price-book.service.js';
import type { Caller } from '../shared/access/caller.js';
import { PartWatch } from './entities/part-watch.entity.js';
import { atNewQuantity, type WatchedState } from './watched-state.js';

type Team = Pick<Caller, 'teamId'>;

/** A part at saved conditions at which it is chosen. */
export interface Watched {
  part: LivingPart;
  use: PartUse;
  /** What is known of it; null = it is newly chosen. */
  before: WatchedState | null;
  now: WatchedState;
}

/** Keeps what is known of the chosen parts: what they were when they were chosen, or when a change was last told. */
@Injectable()
export class PartWatches implements OnModuleInit {
  constructor(
    private readonly conditions: ConditionsService,
    private readonly library: LibraryService,
    private readonly prices: PriceBookService,
  ) {}

  onModuleInit(): void {
    this.conditions.whenSaved(async (manager, team) => {
      const all = await this.read(manager, team);
      await this.write(manager, all, (before, now) => atNewQuantity(before, now));
    });
  }

  /** All of a team's chosen parts, as they are known and as they are. */
  async read(manager: EntityManager, team: Team): Promise<Watched[]> {
    const uses = await this.conditions.partsInUse(team, manager);
    const ids = [...uses.keys()];
    const parts = await this.library.findParts(manager, team, ids);
    const book = await this.prices.loadOf(manager, team.teamId, ids);
    const known = await findKnown(manager, team);
    return parts.flatMap((part) =>
      uses.get(part.id)!.map((use) => ({
        part,
        use,
        before: known.get(keyOf(use.conditionsId, part.id)) ?? null,
        now: stateOf(part, new QuantityPrices(book, use.quantity), use.quantity),
      })),
    );
  }

  /** Keeps what `next` makes of what was known; of a part that is newly chosen, how it is. */
  async write(
    manager: EntityManager,
    all: readonly Watched[],
    next: (before: WatchedState, now: WatchedState) => WatchedState,
  ): Promise<void> {
    const rows = all.flatMap(({ part, use, before, now }) => {
      const known = before === null ? now : next(before, now);
      const isKept = before !== null && isSame(before, known);
      return isKept ? [] : [{ conditionsId: use.conditionsId, partId: part.id, ...known }];
    });
    if (rows.length > 0) await manager.upsert(PartWatch, rows, ['conditionsId', 'partId']);
  }
}

async function findKnown(manager: EntityManager, { teamId }: Team): Promise<Map<string, WatchedState>> {
  const found = await manager
    .createQueryBuilder(PartWatch, 'watch')
    .innerJoin('watch.chosen', 'chosen')
    .innerJoin('chosen.conditions', 'saved')
    .where('saved.teamId = :teamId', { teamId })
    .getMany();
  return new Map(found.map(({ conditionsId, partId, ...state }) => [keyOf(conditionsId, partId), state]));
}

function keyOf(conditionsId: number, partId: number): string {
  return `${conditionsId} ${partId}`;
}

function stateOf({ id, lifecycle }: LivingPart, prices: QuantityPrices, quantity: number): WatchedState {
  const unitPrice = prices.of(id)?.unitPrice ?? null;
  const currency = unitPrice && prices.book.currency;
  return { lifecycle, available: prices.isAvailable(id), quantity, unitPrice, currency };
}

function isSame(one: WatchedState, other: WatchedState): boolean {
  return (Object.keys(other) as (keyof WatchedState)[]).every((key) => one[key] === other[key]);
}
