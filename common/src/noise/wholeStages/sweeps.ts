import type { Candidate, FoundStage } from './candidates.js';
import { stagesInOrder, type OrderedSearch } from './stagesInOrder.js';

/** All that stages are sought among. */
export type StageSpace = Omit<OrderedSearch, 'by' | 'isOut'>;

/** The quietest stage of each op-amp, and the stages that no other beats in both noise and price. */
export interface QuietestStages {
  rows: FoundStage[];
  /** in ascending order of noise, descending order of price */
  frontier: FoundStage[];
}

/**
 * The quietest stages of the `count` op-amps that make the quietest ones, and the frontier of noise and price:
 * each stage that is cheaper than all quieter ones. Stages without a price don't count there.
 */
export function findQuietest(space: StageSpace, count: number): QuietestStages {
  const taken = new Set<string>();
  const found: QuietestStages = { rows: [], frontier: [] };
  let cheapest = Infinity;
  const isOut: OrderedSearch['isOut'] = ({ candidate, price }) =>
    price >= cheapest && (taken.size >= count || taken.has(partOf(candidate)));
  for (const stage of stagesInOrder({ ...space, by: 'noise', isOut })) {
    const part = partOf(stage.candidate);
    if (taken.size < count && !taken.has(part)) {
      taken.add(part);
      found.rows.push(stage);
    }
    if (stage.price < cheapest) {
      found.frontier.push(stage);
      cheapest = stage.price;
    }
  }
  return found;
}

/** The cheapest stages within a noise, and of how many op-amps there is one. */
export interface CheapestStages {
  total: number;
  rows: FoundStage[];
}

/**
 * The cheapest stage of each op-amp whose noise is at most `limit`, of equally cheap ones the quietest, in
 * ascending order of price, the first `count` of them; op-amps of whose stages none has a price come last, in
 * ascending order of noise.
 *
 * @param sure candidates that are known to make a stage within the limit
 */
export function findCheapest(
  space: StageSpace,
  limit: number,
  count: number,
  sure: readonly Candidate[],
): CheapestStages {
  const taken = new Set<string>();
  const isOut: OrderedSearch['isOut'] = ({ candidate, noise }) =>
    noise > limit || taken.has(partOf(candidate));
  const rows: FoundStage[] = [];
  const search = { ...space, isOut };
  for (const stage of count > 0 ? stagesInOrder({ ...search, by: 'price' }) : []) {
    rows.push(stage);
    taken.add(partOf(stage.candidate));
    if (rows.length === count) break;
  }
  for (const candidate of sure) taken.add(partOf(candidate));
  for (const { candidate } of stagesInOrder({ ...search, by: 'noise' })) taken.add(partOf(candidate));
  return { total: taken.size, rows };
}

function partOf({ library, row }: Candidate): string {
  return `${library} ${row}`;
}
