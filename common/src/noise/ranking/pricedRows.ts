import type { Entrants } from './entrants.js';
import type { Scores } from './scores.js';

/** The rows of all libraries that have a price, as columns. */
export interface PricedRows {
  library: Uint32Array;
  row: Uint32Array;
  price: Float64Array;
  /** what the row's noise isn't below */
  least: Float64Array;
}

/** Sums over other nodes differ by less: each holds 0.1 %. */
const ALMOST = 1 - 2e-3;

/**
 * @param scores of all rows of the libraries without bounds
 * @param prices what each row of each library costs; NaN = without a price
 */
export function listPriced(
  { accepted, bounds }: Entrants,
  scores: readonly Scores[],
  prices: readonly Float64Array[],
): PricedRows {
  const priced = accepted.map((rows, library) => pricedPositions(rows, prices[library]));
  const listed = emptyRows(priced.reduce((sum, { length }) => sum + length, 0));
  let place = 0;
  priced.forEach((positions, library) => {
    const bound = bounds[library];
    for (const position of positions) {
      const row = accepted[library][position];
      listed.library[place] = library;
      listed.row[place] = row;
      listed.price[place] = prices[library][row];
      listed.least[place++] = bound
        ? bound.total[position]
        : ALMOST * scores[library].inputNoiseRms[position];
    }
  });
  return listed;
}

function pricedPositions(rows: Uint32Array, prices: Float64Array | undefined): number[] {
  const positions: number[] = [];
  if (prices === undefined) return positions;
  for (let position = 0; position < rows.length; position++)
    if (!Number.isNaN(prices[rows[position]])) positions.push(position);
  return positions;
}

function emptyRows(count: number): PricedRows {
  return {
    library: new Uint32Array(count),
    row: new Uint32Array(count),
    price: new Float64Array(count),
    least: new Float64Array(count),
  };
}

const RANGES = 256;

/** Parts the prices into ranges, equal in their logarithm; a larger price is never in a lower range. */
export function priceRanges(prices: Float64Array): (price: number) => number {
  let least = Infinity;
  let most = 0;
  for (const price of prices) {
    if (price > 0 && price < least) least = price;
    if (price > most) most = price;
  }
  const width = Math.log(most / least) / (RANGES - 1);
  return (price) => (price > least && width > 0 ? Math.floor(Math.log(price / least) / width) : 0);
}
