import {
  dayOf,
  type ExchangeRates,
  isValidOn,
  type Offer as OfferOfSupplier,
  offerStates,
  priceAt,
  type PriceAtQuantity,
} from '@roothertz/common/prices';
import { currentRates, type DatedRate, toExchangeRates } from './dated-rates.js';
import type { Offer } from './entities/offer.entity.js';
import { termsOf } from './offer-terms.js';

/** All that a team's prices are worked out from, at a revision. */
export interface PriceBook {
  currency: string;
  staleAfterDays: number;
  rates: DatedRate[];
  /** by the part's id */
  offers: ReadonlyMap<number, OfferOfSupplier[]>;
}

/** What parts cost at a quantity, today. */
export class QuantityPrices {
  private readonly today = dayOf(new Date());
  private readonly rates: ExchangeRates;
  private readonly known = new WeakMap<ArrayLike<number>, Float64Array>();

  constructor(
    readonly book: PriceBook,
    private readonly quantity: number,
  ) {
    this.rates = toExchangeRates(currentRates(book.rates, this.today));
  }

  /** Whether these are the prices at a quantity on the day that it is now. */
  areAt(quantity: number): boolean {
    return this.quantity === quantity && this.today === dayOf(new Date());
  }

  /** What each part costs in all, NaN where no offer counts; of the same list only worked out once. */
  totals(partIds: ArrayLike<number>): Float64Array {
    const known = this.known.get(partIds);
    if (known) return known;
    const totals = new Float64Array(partIds.length).fill(NaN);
    for (let place = 0; place < totals.length; place++) {
      const price = this.of(partIds[place]);
      if (price !== null) totals[place] = Number(price.total);
    }
    this.known.set(partIds, totals);
    return totals;
  }

  /** Null where no offer for the part counts. */
  of(partId: number): PriceAtQuantity | null {
    const offers = this.book.offers.get(partId);
    return offers ? priceAt(offers, this.quantity, this.rates, this.book.currency, this.today) : null;
  }

  /** Whether an offer holds today whose stock isn't known to be 0. */
  isAvailable(partId: number): boolean {
    const offers = this.book.offers.get(partId) ?? [];
    return offers.some((offer) => isValidOn(offer, this.today) && offer.stock !== 0);
  }

  isStale(offer: OfferOfSupplier): boolean {
    return offerStates(offer, this.book.staleAfterDays, this.today).includes('stale');
  }
}

export function toPricedOffer(offer: Offer): OfferOfSupplier {
  const confirmedAt = offer.confirmedAt.toISOString();
  return { supplier: offer.supplier.name, ...termsOf(offer), confirmedAt };
}
