import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import { EXCLUSION_REASONS, type ExclusionReason } from '../cautions.js';
import type { StageModel } from '../stage/model.js';
import { stageModel } from '../stage/stageModel.js';
import type { AmplifierColumns } from './columns.js';
import { isSought, prepareExclusions, RANKED, searchWords } from './exclusions.js';

/** Where a part stands: which of the given libraries, and which row of it. */
export interface PartPlace {
  library: number;
  row: number;
}

export interface ExcludedPart extends PartPlace {
  reason: ExclusionReason;
}

/** How many parts are excluded, and for each reason how many, the most frequent one first. */
export interface ExclusionCounts {
  total: number;
  reasons: { reason: ExclusionReason; count: number }[];
}

interface SiftQuery {
  conditions: OperatingConditions;
  filter: PartFilter;
}

/** A page of the excluded parts of the libraries, without ranking the others, and how many there are in all. */
export function findExcluded(
  query: SiftQuery,
  libraries: readonly AmplifierColumns[],
  { limit, offset }: { limit: number; offset: number },
): { items: ExcludedPart[]; total: number } {
  const model = stageModel(query.conditions);
  const items: ExcludedPart[] = [];
  let total = 0;
  libraries.forEach((columns, library) =>
    siftLibrary(query, model, columns, (row, reason) => {
      if (total >= offset && total < offset + limit)
        items.push({ library, row, reason: EXCLUSION_REASONS[reason] });
      total++;
    }),
  );
  return { items, total };
}

/** Parts the rows of the libraries into those to rank and those excluded; what isn't sought is in neither. */
export function sift(
  query: SiftQuery,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
): { accepted: Uint32Array[]; excluded: ExclusionCounts } {
  const counts = EXCLUSION_REASONS.map(() => 0);
  const accepted = libraries.map((columns) =>
    siftLibrary(query, model, columns, (_, reason) => counts[reason]++),
  );
  return { accepted, excluded: toExclusionCounts(counts) };
}

/** The rows of a library to rank, in ascending order; the others are left with the places of their reasons. */
function siftLibrary(
  { conditions, filter }: SiftQuery,
  model: StageModel,
  columns: AmplifierColumns,
  leave: (row: number, reason: number) => void,
): Uint32Array {
  const exclude = prepareExclusions(conditions, filter, model, columns);
  const words = searchWords(filter.search);
  const accepted = new Uint32Array(columns.count);
  let count = 0;
  for (let row = 0; row < columns.count; row++) {
    if (words.length > 0 && !isSought(columns, row, words)) continue;
    const reason = exclude(row);
    if (reason === RANKED) accepted[count++] = row;
    else leave(row, reason);
  }
  return accepted.subarray(0, count);
}

/** @param counts by the places of the reasons in EXCLUSION_REASONS */
function toExclusionCounts(counts: readonly number[]): ExclusionCounts {
  const reasons = EXCLUSION_REASONS.map((reason, place) => ({ reason, count: counts[place] }));
  return {
    total: counts.reduce((sum, count) => sum + count, 0),
    reasons: reasons.filter(({ count }) => count > 0).sort((a, b) => b.count - a.count),
  };
}
