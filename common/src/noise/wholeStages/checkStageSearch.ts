import { checkConditions, type PartFilter } from '../../conditions/index.js';
import { boundsError, type FieldError } from '../../parts/index.js';
import { nominalNetwork, withNetwork, type SoughtConditions } from './stageSearch.js';
import { STAGE_SEARCH_FIELDS } from './stageSearchFields.js';

/**
 * Everything that is wrong with a search for whole stages, field by field: as `checkConditions`, and the
 * network's limits against each other. Empty = it can be ranked.
 */
export function checkStageSearch(conditions: SoughtConditions, filter?: PartFilter): FieldError[] {
  const { gainTolerance, parallelMaximum, network } = conditions.stage;
  const values = {
    'conditions.stage.gainTolerance': gainTolerance,
    'conditions.stage.network.maximumTotal': network.maximumTotal,
    'conditions.stage.parallelMaximum': parallelMaximum,
  };
  const bounds = Object.entries(values).flatMap(([field, value]) => {
    const message = boundsError(STAGE_SEARCH_FIELDS[field as keyof typeof values], value);
    return message === null ? [] : [{ field, message }];
  });
  return [
    ...bounds,
    ...checkLimits(conditions),
    ...checkParallel(conditions),
    ...checkNominal(conditions, filter),
  ];
}

function checkLimits({ stage: { network } }: SoughtConditions): FieldError[] {
  if (network.maximumTotal >= network.minimumTotal) return [];
  const message = 'network, at most: not below what the output drives at least';
  return [{ field: 'conditions.stage.network.maximumTotal', message }];
}

/** Elsewhere the source sees the networks of joined channels, and the gain isn't that of one. */
function checkParallel({ stage: { topology, parallelMaximum } }: SoughtConditions): FieldError[] {
  if (topology === 'non-inverting' || parallelMaximum === 1) return [];
  const message = 'channels in parallel, at most: only non-inverting stages are joined, set it to 1';
  return [{ field: 'conditions.stage.parallelMaximum', message }];
}

/** The stage at the wanted gain must be one that can be computed; its network isn't the asker's to state. */
function checkNominal(conditions: SoughtConditions, filter?: PartFilter): FieldError[] {
  const nominal = withNetwork(conditions, nominalNetwork(conditions));
  return checkConditions({ conditions: nominal, filter }).filter(
    ({ field }) => field !== 'conditions.stage.gainResistance',
  );
}
