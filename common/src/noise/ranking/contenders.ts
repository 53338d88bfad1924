import { smallestPositions } from '../../numeric/index.js';
import { score, type Entrants } from './entrants.js';
import type { LeastNoise } from './leastNoise.js';
import type { RowPlace } from './page.js';
import { preparedColumns } from './preparedColumns.js';
import { findQuietest, type Quietest } from './quietSet.js';
import type { Scores } from './scores.js';

/**
 * Scores the rows that can be among the `count` quietest or in the quiet set, and those that are wanted
 * besides: all others have a lower bound that rules them out, and needn't be integrated.
 *
 * @param count at least 1
 * @param wanted places in `accepted`
 * @returns scores with rows in the order of `accepted`
 */
export function scoreContenders(
  entrants: Entrants,
  count: number,
  wanted: readonly RowPlace[] = [],
): Scores[] {
  const { accepted, bounds } = entrants;
  const isLikely = bounds.map((bound, library) => bound && amongQuietest(entrants, library, bound, count));
  const likely = isLikely.map((keeps, library) =>
    score(entrants, library, keeps ? rowsAt(accepted[library], keeps) : accepted[library]),
  );
  const quietest = findQuietest(likely);
  return bounds.map((bound, library) => {
    if (bound === null || quietest === null) return likely[library];
    const isNear = nearQuietest(entrants, library, bound, quietest);
    const isWanted = new Set(wanted.flatMap((place) => (place.library === library ? place.position : [])));
    const keeps = (position: number) =>
      isNear(position) || isLikely[library]!(position) || isWanted.has(position);
    return score(entrants, library, rowsAt(accepted[library], keeps));
  });
}

function rowsAt(rows: Uint32Array, keeps: (position: number) => boolean): Uint32Array {
  const kept = [];
  for (let position = 0; position < rows.length; position++) if (keeps(position)) kept.push(rows[position]);
  return Uint32Array.from(kept);
}

/** Says of a position whether it can be among a library's `count` quietest. */
function amongQuietest(entrants: Entrants, library: number, { total }: LeastNoise, count: number) {
  const rows = entrants.accepted[library];
  if (rows.length <= count) return () => true;
  const likely = smallestPositions(total, count).map((position) => rows[position]);
  const last = score(entrants, library, likely).inputNoiseRms.reduce((a, b) => Math.max(a, b), 0);
  return (position: number) => total[position] <= last;
}

/**
 * Says of a position whether its total may not be told from the quietest one's, at the widest spread
 * downwards. Only the amplifier's share of a total spreads: T − F²/T of a total T with a fixed part F.
 */
function nearQuietest(
  { libraries, accepted }: Entrants,
  library: number,
  least: LeastNoise,
  { inputNoiseRms, above }: Quietest,
): (position: number) => boolean {
  const { classes, spreadLimits } = preparedColumns(libraries[library]);
  const rows = accepted[library];
  return (position) => {
    const total = least.total[position];
    const difference = total - inputNoiseRms;
    const limit = spreadLimits[classes.of[rows[position]]];
    const below = limit * (total - (least.fixed[position] * least.fixed[position]) / total);
    return difference <= 0 || difference * difference <= below * below + above * above;
  };
}
