import { score, type Entrants } from './entrants.js';
import { listPriced, priceRanges, type PricedRows } from './pricedRows.js';
import type { Scores } from './scores.js';
import type { PartPlace } from './sift.js';

/** A part of the frontier with what places it there. */
export interface FrontierPart extends PartPlace {
  inputNoiseRms: number;
  price: number;
}

/**
 * The noise–price frontier: the parts that no other beats in both noise and price, the quietest first. Parts
 * without a price don't count; of equal parts the first one does.
 *
 * In each range of prices the part with the least bound is scored; what these don't rule out are few.
 *
 * @param scores of all rows of the libraries without bounds
 * @param prices what each row of each library costs; NaN = without a price
 */
export function findFrontier(
  entrants: Entrants,
  scores: readonly Scores[],
  prices: readonly Float64Array[] = [],
): FrontierPart[] {
  const priced = listPriced(entrants, scores, prices);
  const pilots = scorePlaces(entrants, priced, findPilots(priced));
  const kept = scorePlaces(entrants, priced, findUnbeaten(priced, pilots));
  return recordsOf(kept.sort(byPrice)).reverse();
}

/** In ascending order of price, of equally cheap ones the quieter first. */
function byPrice(one: FrontierPart, other: FrontierPart): number {
  return one.price - other.price || one.inputNoiseRms - other.inputNoiseRms;
}

/** Those whose noise is below that of all before them. */
function recordsOf(sorted: readonly FrontierPart[]): FrontierPart[] {
  let lowest = Infinity;
  return sorted.filter(({ inputNoiseRms }) => {
    const isRecord = inputNoiseRms < lowest;
    if (isRecord) lowest = inputNoiseRms;
    return isRecord;
  });
}

/** The place with the least bound in each range of prices that has one. */
function findPilots({ price, least }: PricedRows): number[] {
  const rangeOf = priceRanges(price);
  const pilots: number[] = [];
  for (let place = 0; place < price.length; place++) {
    const range = rangeOf(price[place]);
    const pilot = pilots[range];
    if (pilot === undefined || least[place] < least[pilot]) pilots[range] = place;
  }
  return pilots.filter((place) => place !== undefined);
}

/** The places that no pilot, as cheap or cheaper, is certain to be quieter than. */
function findUnbeaten({ price, least }: PricedRows, pilots: readonly FrontierPart[]): number[] {
  const steps = recordsOf(pilots.toSorted(byPrice));
  const unbeaten: number[] = [];
  for (let place = 0; place < price.length; place++) {
    const step = steps[countUpTo(steps, price[place]) - 1];
    if (step === undefined || least[place] <= step.inputNoiseRms) unbeaten.push(place);
  }
  return unbeaten;
}

/** How many of the parts, in ascending order of price, cost no more. */
function countUpTo(sorted: readonly FrontierPart[], price: number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (sorted[middle].price <= price) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** The parts at the places, with their noise. */
function scorePlaces(entrants: Entrants, priced: PricedRows, places: readonly number[]): FrontierPart[] {
  return entrants.libraries.flatMap((_, library) => {
    const own = places.filter((place) => priced.library[place] === library);
    const rows = Uint32Array.from(own, (place) => priced.row[place]);
    const { inputNoiseRms } = score(entrants, library, rows);
    return own.map((place, position) => ({
      library,
      row: rows[position],
      price: priced.price[place],
      inputNoiseRms: inputNoiseRms[position],
    }));
  });
}
