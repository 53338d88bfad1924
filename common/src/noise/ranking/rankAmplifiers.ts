import type { OperatingConditions, PartFilter, RankingTarget } from '../../conditions/index.js';
import { smallestPositions } from '../../numeric/index.js';
import type { SourceFloor, StageFigures } from '../figures.js';
import { stageModel } from '../stage/stageModel.js';
import type { StageModel } from '../stage/model.js';
import { stageAmplifier } from '../stageAmplifier.js';
import { stageCautions } from '../stageCautions.js';
import { figuresFrom, floorFrom } from '../stageFigures.js';
import { amplifierAt, type AmplifierColumns } from './columns.js';
import { findContenders } from './contenders.js';
import { findFrontier, type FrontierPart } from './frontier.js';
import { findCheapest, type CheapestPart } from './cheapest.js';
import { countQuietSet, findQuietest, isInQuietSet, type Quietest } from './quietSet.js';
import { scoreRows, type Scores } from './scores.js';
import { sift, type ExcludedPart, type PartPlace } from './sift.js';

/** The figures by which a ranking can be sorted; `-` in front = descending. */
export const RANKING_SORTS = [
  'inputNoiseRms',
  'inputNoiseDensity',
  'outputNoiseRms',
  'noiseFigure',
  'aboveFloor',
  'closedLoopBandwidth',
] as const;

/** What a ranking of parts with prices can be sorted by. */
export const PRICED_RANKING_SORTS = [...RANKING_SORTS, 'unitPrice'] as const;
export type RankingSort = (typeof PRICED_RANKING_SORTS)[number];

/** What is to be ranked, and which part of the answer is wanted. */
export interface RankingQuery {
  conditions: OperatingConditions;
  filter: PartFilter;
  target: RankingTarget;
  sort: RankingSort;
  descending: boolean;
  limit: number;
  offset: number;
  /** what each row of each library costs, in one currency; NaN = without a price */
  prices?: readonly Float64Array[];
}

export interface RankedPart extends PartPlace {
  rank: number;
  figures: StageFigures;
  quietSet: boolean;
  /** null where there is no target */
  meetsTarget: boolean | null;
}

export interface Ranking {
  /** how many parts are ranked */
  total: number;
  excluded: ExcludedPart[];
  floor: SourceFloor;
  quietSetTotal: number;
  /** the cheapest part of the quiet set; null where none of it has a price */
  cheapest: CheapestPart | null;
  /** the parts that no other beats in both noise and price, the quietest first */
  frontier: FrontierPart[];
  items: RankedPart[];
}

/**
 * Ranks the op-amps of several libraries by a figure of the stage that each makes.
 *
 * @param query conditions free of `checkConditions` errors, and the page wanted
 * @param libraries columns in SI units
 * @returns the page's parts with all figures, the excluded parts with their reasons, the source floor and
 *   the size of the quiet set; parts with equal figures stand in the order of the libraries
 */
export function rankAmplifiers(query: RankingQuery, libraries: readonly AmplifierColumns[]): Ranking {
  const { conditions } = query;
  const model = stageModel(conditions);
  const { accepted, excluded } = sift(query, model, libraries);
  const contenders =
    query.sort === 'inputNoiseRms' && !query.descending
      ? findContenders(conditions, model, libraries, accepted, query.offset + query.limit)
      : accepted;
  const scores = libraries.map((columns, library) =>
    scoreRows(conditions, model, columns, contenders[library]),
  );
  const quietest = findQuietest(scores);
  const keys = sortKeys(query, model, libraries, scores);
  const page = smallestPositions(keys, query.offset + query.limit).subarray(query.offset);
  const places = placesOf(scores);
  return {
    total: accepted.reduce((total, rows) => total + rows.length, 0),
    excluded,
    floor: floorFrom(conditions, model),
    quietSetTotal: countQuietSet(scores, quietest),
    cheapest: findCheapest(scores, quietest, query.prices),
    frontier: findFrontier(conditions, model, libraries, accepted, query.prices),
    items: Array.from(page, (place, index) =>
      rankedPart(query, model, libraries, scores, quietest!, places(place), query.offset + index + 1),
    ),
  };
}

interface ScoredPlace {
  library: number;
  position: number;
}

/** From the position in the joined keys of all libraries to the library and the position in its scores. */
function placesOf(scores: readonly Scores[]): (joined: number) => ScoredPlace {
  return (joined) => {
    let library = 0;
    let position = joined;
    while (position >= scores[library].rows.length) position -= scores[library++].rows.length;
    return { library, position };
  };
}

function sortKeys(
  query: RankingQuery,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
  scores: readonly Scores[],
): Float64Array {
  const keys = new Float64Array(scores.reduce((total, { rows }) => total + rows.length, 0));
  const sign = query.descending ? -1 : 1;
  let joined = 0;
  scores.forEach((scored, library) => {
    const valueAt = sortValue(query, model, libraries[library], scored, query.prices?.[library]);
    for (let position = 0; position < scored.rows.length; position++)
      keys[joined++] = sign * (valueAt(position) ?? NaN);
  });
  return keys;
}

/** The value that a position of a library's scores is sorted by; null or NaN where there is none. */
function sortValue(
  { sort, conditions }: RankingQuery,
  model: StageModel,
  columns: AmplifierColumns,
  scores: Scores,
  prices: Float64Array | undefined,
): (position: number) => number | null {
  if (sort === 'inputNoiseRms') return (position) => scores.inputNoiseRms[position];
  if (sort === 'unitPrice') return (position) => prices?.[scores.rows[position]] ?? null;
  return (position) => figuresAt(conditions, model, columns, scores, position)[sort];
}

function figuresAt(
  conditions: OperatingConditions,
  model: StageModel,
  columns: AmplifierColumns,
  scores: Scores,
  position: number,
) {
  const amplifier = amplifierAt(columns, scores.rows[position]);
  const { evaluate } = scores.groups[scores.groupOf[position]];
  return figuresFrom(conditions, model, stageAmplifier(conditions, amplifier), evaluate, scores.atReference);
}

function rankedPart(
  { conditions, filter, target }: RankingQuery,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
  scores: readonly Scores[],
  quietest: Quietest,
  { library, position }: ScoredPlace,
  rank: number,
): RankedPart {
  const row = scores[library].rows[position];
  const figures = figuresAt(conditions, model, libraries[library], scores[library], position);
  const cautions = stageCautions(conditions, model, amplifierAt(libraries[library], row), filter);
  return {
    library,
    row,
    rank,
    figures: { ...figures, cautions },
    quietSet: isInQuietSet(scores[library], position, quietest),
    meetsTarget: target.inputNoiseRms === undefined ? null : figures.inputNoiseRms <= target.inputNoiseRms,
  };
}
