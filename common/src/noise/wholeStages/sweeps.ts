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

/**
 * The cheapest stage of each op-amp whose noise is at most `limit`, of equally cheap ones the quietest, in
 * ascending order of price; op-amps of whose stages none has a price come last, in ascending order of noise.
 */
export function findCheapest(space: StageSpace, limit: number): FoundStage[] {
  const taken = new Set<string>();
  const isOut: OrderedSearch['isOut'] = ({ candidate, noise }) =>
    noise > limit || taken.has(partOf(candidate));
  const found: FoundStage[] = [];
  for (const stage of stagesInOrder({ ...space, by: 'price', isOut })) {
    found.push(stage);
    taken.add(partOf(stage.candidate));
  }
  return found;
}

function partOf({ library, row }: Candidate): string {
  return `${library} ${row}`;
}
