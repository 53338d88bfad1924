import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import type { ExclusionReason } from '../cautions.js';
import type { StageModel } from '../stage/model.js';
import { stageModel } from '../stage/stageModel.js';
import type { AmplifierColumns } from './columns.js';
import { isSought, prepareExclusions, searchWords } from './exclusions.js';

/** Where a part stands: which of the given libraries, and which row of it. */
export interface PartPlace {
  library: number;
  row: number;
}

export interface ExcludedPart extends PartPlace {
  reason: ExclusionReason;
}

interface SiftQuery {
  conditions: OperatingConditions;
  filter: PartFilter;
}

/** The excluded parts of the libraries, without ranking the others. */
export function findExcluded(query: SiftQuery, libraries: readonly AmplifierColumns[]): ExcludedPart[] {
  return sift(query, stageModel(query.conditions), libraries).excluded;
}

/** Parts the rows of the libraries into those to rank and those excluded; what isn't sought is in neither. */
export function sift(
  { conditions, filter }: SiftQuery,
  model: StageModel,
  libraries: readonly AmplifierColumns[],
) {
  const exclude = prepareExclusions(conditions, filter, model);
  const words = searchWords(filter.search);
  const excluded: ExcludedPart[] = [];
  const accepted = libraries.map((columns, library) => {
    const rows = new Uint32Array(columns.count);
    let count = 0;
    for (let row = 0; row < columns.count; row++) {
      if (words.length > 0 && !isSought(columns, row, words)) continue;
      const reason = exclude(columns, row);
      if (reason) excluded.push({ library, row, reason });
      else rows[count++] = row;
    }
    return rows.subarray(0, count);
  });
  return { accepted, excluded };
}
