import type { OperatingConditions } from '../../conditions/index.js';
import { smallestPositions } from '../../numeric/index.js';
import { ORIGIN_SPREAD } from '../relativeSpread.js';
import type { StageModel } from '../stage/model.js';
import type { AmplifierColumns } from './columns.js';
import { leastNoise, type LeastNoise } from './leastNoise.js';
import { SPREAD_GROWTH, preparedColumns } from './preparedColumns.js';
import { scoreRows } from './scores.js';

/** From this many parts on, bounds cost less than they save. */
const WORTH_BOUNDING = 4000;
const WIDEST_ABOVE = SPREAD_GROWTH * Math.max(...Object.values(ORIGIN_SPREAD).map(({ above }) => above));

/**
 * The rows that can be among the `count` quietest or in the quiet set: all others have a lower bound that
 * rules them out, and needn't be integrated. Few rows are all kept.
 *
 * @param accepted the rows to rank, one array a library
 * @returns rows in the order of `accepted`
 */
export function findContenders(
  conditions: OperatingConditions,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
  accepted: readonly Uint32Array[],
  count: number,
): Uint32Array[] {
  return libraries.map((columns, library) => {
    const rows = accepted[library];
    if (rows.length < WORTH_BOUNDING || model.canNotch) return rows;
    const least = leastNoise(conditions, model, columns, rows);
    const likely = smallestPositions(least.total, count).map((position) => rows[position]);
    const totals = scoreRows(conditions, model, columns, likely).inputNoiseRms;
    const last = likely.length < count ? Infinity : totals.reduce((a, b) => Math.max(a, b), 0);
    const isNear = nearQuietest(totals, least, preparedColumns(columns).spreadLimit, rows);
    return rows.filter((_, position) => least.total[position] <= last || isNear(position));
  });
}

/**
 * Says of a position whether its total may not be told from the quietest one's, at the widest spreads. Only
 * the amplifier's share of a total spreads: T − F²/T of a total T with a fixed part F.
 */
function nearQuietest(totals: Float64Array, least: LeastNoise, spreadLimit: Float64Array, rows: Uint32Array) {
  const quietest = totals.reduce((a, b) => Math.min(a, b), Infinity);
  const leastFixed = least.fixed.reduce((a, b) => Math.min(a, b), Infinity);
  const above = WIDEST_ABOVE * (quietest - leastFixed ** 2 / quietest);
  return (position: number) => {
    const total = least.total[position];
    const difference = total - quietest;
    const below = spreadLimit[rows[position]] * (total - least.fixed[position] ** 2 / total);
    return difference <= 0 || difference * difference <= below * below + above * above;
  };
}
