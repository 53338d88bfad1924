import { dividedHalfUp, PRICE_DECIMALS, RATE_DECIMALS, rescaled, scaledText, toScaled } from './money.js';
import { isValidOn, type Offer } from './offer.js';

/** A unit of each currency in the team's currency, as decimal texts by the code of the currency. */
export type ExchangeRates = Readonly<Record<string, string | undefined>>;

/** An order that covers the quantity that is needed; amounts are in the team's currency. */
export interface Order<Kind extends Offer = Offer> {
  offer: Kind;
  /** the quantity from which on the break that counts holds */
  minimumQuantity: number;
  /** pieces that have to be bought */
  orderQuantity: number;
  /** what these pieces cost, with four decimals */
  total: string;
  /** the total over the pieces that are needed, with four decimals */
  unitPrice: string;
}

export interface PriceAtQuantity<Kind extends Offer = Offer> extends Order<Kind> {
  /** more pieces that cost less in all, as 100 can cost less than 95; null where there are none */
  cheaperOrder: Order<Kind> | null;
}

const COST_DECIMALS = PRICE_DECIMALS + RATE_DECIMALS;

interface Candidate<Kind extends Offer> {
  offer: Kind;
  minimumQuantity: number;
  orderQuantity: number;
  isLeast: boolean;
  cost: bigint;
}

/**
 * What a quantity of a part costs: of all offers that are valid on a day, the one whose least order that
 * covers the quantity, with MOQ and order multiple, costs least in all. Offers in a currency without a rate
 * don't count. At equal cost fewer pieces come first, then the offer that is given first.
 *
 * The unit price is the total over the pieces that are needed: that of the break, or more where more
 * pieces have to be bought.
 *
 * @param offers of one part, each free of `checkOffer` errors
 * @param quantity pieces that are needed, a whole number from 1
 * @param date the day, such as `2026-12-01`
 * @returns null where no offer counts
 */
export function priceAt<Kind extends Offer>(
  offers: readonly Kind[],
  quantity: number,
  rates: ExchangeRates,
  teamCurrency: string,
  date: string,
): PriceAtQuantity<Kind> | null {
  const candidates = offers
    .filter((offer) => isValidOn(offer, date))
    .flatMap((offer) => candidatesOf(offer, quantity, rateOf(offer, rates, teamCurrency)));
  const least = cheapest(candidates.filter(({ isLeast }) => isLeast));
  const best = cheapest(candidates);
  if (least === null || best === null) return null;
  return {
    ...toOrder(least, quantity),
    cheaperOrder: best.cost < least.cost ? toOrder(best, quantity) : null,
  };
}

function rateOf({ currency }: Offer, rates: ExchangeRates, teamCurrency: string): bigint | null {
  if (currency === teamCurrency) return 10n ** BigInt(RATE_DECIMALS);
  const rate = rates[currency];
  return rate === undefined ? null : toScaled(rate, RATE_DECIMALS);
}

/** The least order that covers the quantity, and the least order at each break beyond it. */
function candidatesOf<Kind extends Offer>(
  offer: Kind,
  quantity: number,
  rate: bigint | null,
): Candidate<Kind>[] {
  if (rate === null) return [];
  const least = orderQuantity(offer, quantity);
  const larger = offer.breaks.flatMap(({ minimumQuantity }) =>
    minimumQuantity > least ? [orderQuantity(offer, minimumQuantity)] : [],
  );
  return [least, ...larger].map((pieces) => {
    const { minimumQuantity, unitPrice } = breakAt(offer, pieces);
    const cost = toScaled(unitPrice, PRICE_DECIMALS) * BigInt(pieces) * rate;
    return { offer, minimumQuantity, orderQuantity: pieces, isLeast: pieces === least, cost };
  });
}

function orderQuantity({ breaks, minimumOrderQuantity, orderMultiple }: Offer, wanted: number): number {
  const least = Math.max(wanted, minimumOrderQuantity, breaks[0].minimumQuantity);
  return Math.ceil(least / orderMultiple) * orderMultiple;
}

function breakAt({ breaks }: Offer, pieces: number) {
  return breaks.findLast(({ minimumQuantity }) => minimumQuantity <= pieces)!;
}

function cheapest<Kind extends Offer>(candidates: readonly Candidate<Kind>[]): Candidate<Kind> | null {
  return candidates.reduce<Candidate<Kind> | null>(
    (best, candidate) => (best === null || isBetter(candidate, best) ? candidate : best),
    null,
  );
}

function isBetter(one: Candidate<Offer>, other: Candidate<Offer>): boolean {
  return one.cost < other.cost || (one.cost === other.cost && one.orderQuantity < other.orderQuantity);
}

function toOrder<Kind extends Offer>(
  { offer, minimumQuantity, orderQuantity: pieces, cost }: Candidate<Kind>,
  quantity: number,
): Order<Kind> {
  const exactly = dividedHalfUp(cost, BigInt(quantity) * 10n ** BigInt(RATE_DECIMALS));
  return {
    offer,
    minimumQuantity,
    orderQuantity: pieces,
    total: scaledText(rescaled(cost, COST_DECIMALS, PRICE_DECIMALS), PRICE_DECIMALS),
    unitPrice: scaledText(exactly, PRICE_DECIMALS),
  };
}
