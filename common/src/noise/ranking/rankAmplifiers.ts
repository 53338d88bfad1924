import type { OperatingConditions, PartFilter, RankingTarget } from '../../conditions/index.js';
import type { SourceFloor } from '../figures.js';
import { stageModel } from '../stage/stageModel.js';
import { floorFrom } from '../stageFigures.js';
import { findCheapest, type CheapestPart } from './cheapest.js';
import type { AmplifierColumns } from './columns.js';
import { scoreContenders } from './contenders.js';
import { withBounds, withoutBounds, type Field } from './entrants.js';
import { findFrontier, type FrontierPart } from './frontier.js';
import { firstPlaces } from './page.js';
import { countQuietSet, findQuietest } from './quietSet.js';
import { toRankedPart, type RankedPart } from './rankedPart.js';
import { sift, type ExclusionCounts } from './sift.js';
import { scoredKeys, spotKeys, type RankingSort } from './sortKeys.js';

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

export interface Ranking {
  /** how many parts are ranked */
  total: number;
  excluded: ExclusionCounts;
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
 * @returns the page's parts with all figures, the excluded parts by their reasons, the source floor and
 *   the size of the quiet set; parts with equal figures stand in the order of the libraries
 */
export function rankAmplifiers(query: RankingQuery, libraries: readonly AmplifierColumns[]): Ranking {
  const { conditions, prices, offset } = query;
  const model = stageModel(conditions);
  const { accepted, excluded } = sift(query, model, libraries);
  const { entrants, scores, keyOf } = scoreWanted(query, { conditions, model, libraries, accepted });
  const quietest = findQuietest(scores);
  const ofScored = scores.map(({ rows }) => rows);
  const first = firstPlaces(query, ofScored, keyOf);
  return {
    total: accepted.reduce((total, { length }) => total + length, 0),
    excluded,
    floor: floorFrom(conditions, model),
    quietSetTotal: countQuietSet(scores, quietest),
    cheapest: findCheapest(scores, quietest, prices),
    frontier: findFrontier(entrants, scores, prices),
    items: first.slice(offset).map((place, index) => ({
      rank: offset + index + 1,
      ...toRankedPart(query, entrants, scores, quietest!, place),
    })),
  };
}

/** Scores what page, quiet set and frontier take; all rows where the page is by a sum over the band but the noise's. */
function scoreWanted(query: RankingQuery, field: Field) {
  const { sort, descending, offset, limit, prices } = query;
  const spot = spotKeys(sort, field, prices);
  const isBounded = spot !== null || (sort === 'inputNoiseRms' && !descending);
  const entrants = isBounded ? withBounds(field) : withoutBounds(field);
  const scores = scoreContenders(
    entrants,
    spot === null ? offset + limit : 1,
    spot === null ? [] : firstPlaces(query, field.accepted, spot),
  );
  return { entrants, scores, keyOf: spot ?? scoredKeys(sort, entrants, scores) };
}
