import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import { addedPower, type Generators } from '../budget.js';
import { INTEGRAL, INTEGRALS, type Evaluate, type StageModel } from '../stage/model.js';
import { stageModel } from '../stage/stageModel.js';
import { referenceEvaluation } from '../stageFigures.js';
import type { AmplifierColumns } from './columns.js';
import { conditionExclusions, filterExclusions, isSought, RANKED, searchWords } from './exclusions.js';
import { prepareGenerators } from './generators.js';
import { leastAddedIntegrals } from './leastAddedIntegrals.js';
import { bucketsOf, type Bucket } from './mapBuckets.js';
import { preparedColumns } from './preparedColumns.js';
import type { PartPlace } from './sift.js';

/** Rounding must not lift a lower bound above the value. */
const ALMOST = 1 - 1e-9;

/** Parts that differ only in what doesn't count here differ by no more: the first of them wins everywhere. */
const ROUNDING = 1e-12;

/** Logarithmic steps of an axis, both ends included. */
export interface MapAxis {
  from: number;
  to: number;
  steps: number;
}

export interface MapQuery {
  /** everything but source resistance and frequency, which the axes give */
  conditions: OperatingConditions;
  filter: PartFilter;
  /** Ω */
  resistance: MapAxis;
  /** Hz */
  frequency: MapAxis;
}

export interface QuietestMap {
  /** Ω */
  resistances: number[];
  /** Hz */
  frequencies: number[];
  /** The parts that win anywhere. */
  parts: PartPlace[];
  /** For each resistance a row with, for each frequency, an index into `parts`; −1 = no part is fast and stable enough. */
  winners: number[][];
}

/** The points of an axis, each a constant factor above the one before. */
export function axisPoints({ from, to, steps }: MapAxis): number[] {
  if (steps === 1) return [from];
  return Array.from({ length: steps }, (_, n) =>
    n === steps - 1 ? to : from * (to / from) ** (n / (steps - 1)),
  );
}

/** The conditions of one cell: its resistance in Ω, and its frequency in Hz as reference and as end of the band. */
export function cellConditions(
  conditions: OperatingConditions,
  resistance: number,
  frequency: number,
): OperatingConditions {
  return {
    ...conditions,
    source: { ...conditions.source, resistance },
    band: { lower: frequency / 2, upper: frequency, lowPassOrder: 0 },
    referenceFrequency: frequency,
  };
}

/**
 * Which part has the lowest noise density, referred to the source, for each source resistance and each
 * frequency: in each cell the leader of a ranking by `inputNoiseDensity` at `cellConditions`.
 *
 * Where no gain–bandwidth product lowers the density, the least value between the library's extreme input
 * capacitances is a lower bound, and few parts are evaluated: most are passed over in buckets of parts with nearly
 * the same noise.
 */
export function quietestMap(query: MapQuery, libraries: readonly AmplifierColumns[]): QuietestMap {
  const pieces = quietestMapInPieces(query, libraries);
  for (;;) {
    const { done, value } = pieces.next();
    if (done) return value;
  }
}

/** `quietestMap`, a cell at a time: other work can be done at each `yield`. */
export function* quietestMapInPieces(
  query: MapQuery,
  libraries: readonly AmplifierColumns[],
): Generator<void, QuietestMap> {
  const resistances = axisPoints(query.resistance);
  const frequencies = axisPoints(query.frequency);
  const candidates = findCandidates(query.filter, libraries);
  const buckets = bucketsOf(query.conditions, libraries, candidates);
  const parts = new Map<string, { index: number; place: PartPlace }>();
  const indexOf = (place: PartPlace | null) => {
    if (place === null) return -1;
    const key = `${place.library} ${place.row}`;
    if (!parts.has(key)) parts.set(key, { index: parts.size, place });
    return parts.get(key)!.index;
  };
  const winners: number[][] = [];
  for (const resistance of resistances) {
    const row: number[] = [];
    let previous: PartPlace | null = null;
    for (const frequency of frequencies) {
      const conditions = cellConditions(query.conditions, resistance, frequency);
      previous = findWinner(conditions, libraries, buckets, previous);
      row.push(indexOf(previous));
      yield;
    }
    winners.push(row);
  }
  return { resistances, frequencies, parts: [...parts.values()].map(({ place }) => place), winners };
}

/** The rows that are sought and that the filter allows, whatever the cell. */
function findCandidates(filter: PartFilter, libraries: readonly AmplifierColumns[]): Uint32Array[] {
  const words = searchWords(filter.search);
  return libraries.map((columns) => {
    const exclude = filterExclusions(filter, columns);
    const rows = Uint32Array.from({ length: columns.count }, (_, row) => row);
    return rows.filter((row) => isSought(columns, row, words) && exclude(row) === RANKED);
  });
}

function findWinner(
  conditions: OperatingConditions,
  libraries: readonly AmplifierColumns[],
  buckets: readonly Bucket[],
  previous: PartPlace | null,
): PartPlace | null {
  const model = stageModel(conditions);
  const evaluate = referenceEvaluation(conditions, model);
  const excludes = libraries.map((columns) => conditionExclusions(conditions, model, columns));
  const densities = libraries.map((columns) => densitiesOf(conditions, model, evaluate, columns));
  let best = Infinity;
  let winner: PartPlace | null = null;
  const consider = (library: number, row: number) => {
    const density2 = densities[library].at(row);
    const place = { library, row };
    if (density2 > best * (1 + ROUNDING)) return;
    if (density2 >= best * (1 - ROUNDING) && winner !== null && !isBefore(place, winner)) return;
    if (excludes[library](row) !== RANKED) return;
    best = density2;
    winner = place;
  };
  if (previous) consider(previous.library, previous.row);
  for (const { library, rows, least } of buckets) {
    const { leastOf, generatorsAt } = densities[library];
    if (leastOf(least) > best) continue;
    for (const row of rows) if (leastOf(generatorsAt(row)) <= best) consider(library, row);
  }
  return winner;
}

function isBefore(a: PartPlace, b: PartPlace): boolean {
  return a.library < b.library || (a.library === b.library && a.row < b.row);
}

/** What a row adds to the source's squared density, exactly and as a lower bound. */
function densitiesOf(
  conditions: OperatingConditions,
  model: StageModel,
  evaluate: Evaluate,
  columns: AmplifierColumns,
) {
  const { gainBandwidth, inputCapacitance, leastCapacitance, greatestCapacitance } = preparedColumns(columns);
  const generatorsAt = prepareGenerators(conditions, columns);
  const exact = new Float64Array(INTEGRALS);
  const least = model.spotIsQuadratic
    ? leastAddedIntegrals(evaluate, leastCapacitance, greatestCapacitance)
    : null;
  return {
    at(row: number): number {
      evaluate(gainBandwidth[row], inputCapacitance[row], exact);
      return addedPower(exact, generatorsAt(row)) / exact[INTEGRAL.source];
    },
    generatorsAt,
    leastOf(generators: Generators): number {
      return least ? ALMOST * addedPower(least, generators) : 0;
    },
  };
}
