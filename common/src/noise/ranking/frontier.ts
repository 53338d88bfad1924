import type { OperatingConditions } from '../../conditions/index.js';
import type { StageModel } from '../stage/model.js';
import type { AmplifierColumns } from './columns.js';
import { leastNoise } from './leastNoise.js';
import { scoreRows } from './scores.js';
import type { PartPlace } from './sift.js';

/** A part of the frontier with what places it there. */
export interface FrontierPart extends PartPlace {
  inputNoiseRms: number;
  price: number;
}

type Candidate = Omit<FrontierPart, 'inputNoiseRms'> & {
  /** the part's noise is no lower */
  least: number;
};

/** From this many priced parts on, bounds cost less than they save. */
const WORTH_BOUNDING = 4000;

/**
 * The noise–price frontier: the parts that no other beats in both noise and price, the quietest first. Parts
 * without a price don't count; of equal parts the first one does.
 *
 * @param accepted the rows that are ranked, one array a library
 * @param prices what each row of each library costs; NaN = without a price
 */
export function findFrontier(
  conditions: OperatingConditions,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
  accepted: readonly Uint32Array[],
  prices: readonly Float64Array[] = [],
): FrontierPart[] {
  const priced = accepted.map((rows, library) =>
    rows.filter((row) => !Number.isNaN(prices[library]?.[row] ?? NaN)),
  );
  const candidates = listCandidates(conditions, model, libraries, priced, prices);
  const pilots = recordsOf(candidates, ({ least }) => least);
  const scored = score(conditions, model, libraries, pilots);
  const kept = unbeaten(candidates, scored);
  const all = score(conditions, model, libraries, kept);
  return recordsOf(all.sort(byPrice), ({ inputNoiseRms }) => inputNoiseRms).reverse();
}

/** In ascending order of price, of equally cheap ones the quieter first. */
function byPrice(one: FrontierPart, other: FrontierPart): number {
  return one.price - other.price || one.inputNoiseRms - other.inputNoiseRms;
}

function listCandidates(
  conditions: OperatingConditions,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
  priced: readonly Uint32Array[],
  prices: readonly Float64Array[],
): Candidate[] {
  const count = priced.reduce((sum, { length }) => sum + length, 0);
  const isBounded = count >= WORTH_BOUNDING && !model.canNotch;
  const all = priced.flatMap((rows, library) => {
    const least = isBounded ? leastNoise(conditions, model, libraries[library], rows).total : null;
    return Array.from(rows, (row, position) => ({
      library,
      row,
      price: prices[library][row],
      least: least?.[position] ?? 0,
    }));
  });
  return all.sort((one, other) => one.price - other.price || one.least - other.least);
}

/** Those whose value is below all before them. */
function recordsOf<Kind>(sorted: readonly Kind[], valueOf: (one: Kind) => number): Kind[] {
  let lowest = Infinity;
  return sorted.filter((one) => {
    const isRecord = valueOf(one) < lowest;
    if (isRecord) lowest = valueOf(one);
    return isRecord;
  });
}

/** Those that none of the scored ones, as cheap or cheaper, is certain to be quieter than. */
function unbeaten(candidates: readonly Candidate[], scored: readonly FrontierPart[]): Candidate[] {
  let next = 0;
  let quietest = Infinity;
  return candidates.filter(({ price, least }) => {
    for (; next < scored.length && scored[next].price <= price; next++)
      quietest = Math.min(quietest, scored[next].inputNoiseRms);
    return least <= quietest;
  });
}

/** The noise of each, in their order. */
function score(
  conditions: OperatingConditions,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
  candidates: readonly Candidate[],
): FrontierPart[] {
  const noise = libraries.map((columns, library) => {
    const rows = Uint32Array.from(
      candidates.filter((one) => one.library === library),
      ({ row }) => row,
    );
    const { inputNoiseRms } = scoreRows(conditions, model, columns, rows);
    return new Map(Array.from(rows, (row, position) => [row, inputNoiseRms[position]]));
  });
  return candidates.map(({ library, row, price }) => ({
    library,
    row,
    price,
    inputNoiseRms: noise[library].get(row)!,
  }));
}
