import { Injectable } from '@nestjs/common';
import { type PriceBook, QuantityPrices } from '../prices/price-book.js';
import { PriceBookService, type PricedTeam } from '../prices/price-book.service.js';
import type { Caller } from '../shared/access/caller.js';
import { RevisionCache } from '../library/revision-cache.js';

const MOST_QUANTITIES = 3;

/** Keeps the teams' prices in memory, each at the revision that the database has. */
@Injectable()
export class PriceIndex {
  private readonly cache: RevisionCache<PriceBook, PricedTeam>;
  private readonly latest = new WeakMap<PriceBook, QuantityPrices[]>();

  constructor(private readonly books: PriceBookService) {
    this.cache = new RevisionCache((team) => books.load(team));
  }

  /** What the parts cost the caller's team today. */
  async at(caller: Caller, quantity: number): Promise<QuantityPrices> {
    const book = await this.of(caller);
    const kept = this.latest.get(book) ?? [];
    const prices = kept.find((known) => known.areAt(quantity)) ?? new QuantityPrices(book, quantity);
    this.latest.set(book, [prices, ...kept.filter((known) => known !== prices)].slice(0, MOST_QUANTITIES));
    return prices;
  }

  /** The prices of the caller's team, for more than one quantity. */
  async of(caller: Caller): Promise<PriceBook> {
    return this.cache.contentOf(await this.books.teamOf(caller));
  }
}
