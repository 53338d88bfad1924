import type { RankingRequest } from '@roothertz/common/conditions';
import type { Range } from '@roothertz/common/units';

/** The request in another band; a reference frequency that would lie outside moves to the middle of it. */
export function withBand({ conditions, ...request }: RankingRequest, { from, to }: Range): RankingRequest {
  const { referenceFrequency: before, band } = conditions;
  const isInside = from <= before && before <= to;
  return {
    ...request,
    conditions: {
      ...conditions,
      band: { ...band, lower: from, upper: to },
      referenceFrequency: isInside ? before : middleOf(from, to),
    },
  };
}

/** The geometric mean, rounded to what one would write where the band is wide enough for that. */
function middleOf(from: number, to: number): number {
  const middle = Math.sqrt(from * to);
  const rounded = Number(middle.toPrecision(2));
  return from <= rounded && rounded <= to ? rounded : middle;
}
