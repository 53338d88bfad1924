import { CONDITION_FIELDS, type RankingRequest, type StageConditions } from '@roothertz/common/conditions';
import { readAddressQuantity, writeAddressQuantity } from '../address/addressQuantity';
import { WANTED_KEY } from './searchKeys';

/** What a network gives that was taken into the schematic instead of what was wanted of it. */
const FIELDS = {
  gain: { key: 'gain', path: 'conditions.stage.gain' },
  feedbackResistance: { key: 'rf', path: 'conditions.stage.feedbackResistance' },
} as const;

function fieldOf({ topology }: Pick<StageConditions, 'topology'>): keyof typeof FIELDS {
  return topology === 'transimpedance' ? 'feedbackResistance' : 'gain';
}

/** The gain (in a transimpedance stage the resistance) that was wanted before a network was taken; null = none. */
export function readWanted(params: URLSearchParams, stage: StageConditions): number | null {
  const text = params.get(WANTED_KEY);
  const reading =
    text === null ? null : readAddressQuantity(text, CONDITION_FIELDS[FIELDS[fieldOf(stage)].path], false);
  return reading?.ok && typeof reading.value === 'number' ? reading.value : null;
}

/** The address after a network was taken, which holds what the asker had wanted. */
export function withWanted(params: URLSearchParams, asked: StageConditions, found: StageConditions) {
  const field = fieldOf(asked);
  const wanted = asked[field];
  if (wanted === undefined || wanted === found[field]) return params;
  const next = new URLSearchParams(params);
  next.set(WANTED_KEY, writeAddressQuantity(wanted, CONDITION_FIELDS[FIELDS[field].path].kind));
  return next;
}

/** The address in which what was wanted is asked for again. */
export function withWantedAgain(params: URLSearchParams, stage: StageConditions): URLSearchParams {
  const wanted = readWanted(params, stage);
  const next = new URLSearchParams(params);
  if (wanted !== null) next.set(FIELDS[fieldOf(stage)].key, params.get(WANTED_KEY)!);
  next.delete(WANTED_KEY);
  return next;
}

/** Whether the network that was taken still stands in the schematic. */
export function keepsNetwork(before: RankingRequest, after: RankingRequest): boolean {
  const [one, other] = [before.conditions.stage, after.conditions.stage];
  return (['topology', 'gain', 'gainResistance', 'feedbackResistance'] as const).every(
    (field) => one[field] === other[field],
  );
}
