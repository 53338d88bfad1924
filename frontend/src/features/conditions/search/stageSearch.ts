import type {
  PartFilter,
  RankingRequest,
  ResistorFilter,
  ResistorRankingRequest,
  StageConditions,
} from '@roothertz/common/conditions';
import type { SoughtConditions } from '@roothertz/common/noise';
import type { SearchContent } from './searchAddress';
import type { PLACE_KEYS, STAGE_SEARCH_KEYS } from './searchKeys';

/** Ω, what an output drives where nothing else is stated (common practice, no source). */
export const USUAL_MINIMUM_TOTAL = 500;

/** The search for whole stages at the conditions: the network's resistors are what is to be found. */
export function stageRequest(
  { conditions, filter = {} }: RankingRequest,
  { gtol, nmax, par, vout }: SearchContent<typeof STAGE_SEARCH_KEYS>['values'],
) {
  const { network, ...stage } = withoutGainResistance(conditions.stage);
  const sought: SoughtConditions = {
    ...conditions,
    stage: {
      ...stage,
      gainTolerance: gtol,
      network: { minimumTotal: network?.minimumTotal ?? USUAL_MINIMUM_TOTAL, maximumTotal: nmax },
      parallelMaximum: canBeParallel(conditions.stage) ? par : 1,
      outputVoltage: vout,
    },
  };
  return { conditions: sought, filter, resistorFilter: resistorFilterOf(filter) };
}

/** R_g is what is sought. */
function withoutGainResistance(stage: StageConditions): Omit<StageConditions, 'gainResistance'> {
  return Object.fromEntries(Object.entries(stage).filter(([field]) => field !== 'gainResistance')) as Omit<
    StageConditions,
    'gainResistance'
  >;
}

/** Elsewhere the source sees the networks of joined channels, and the gain isn't that of one. */
export function canBeParallel({
  topology,
}: Pick<RankingRequest['conditions']['stage'], 'topology'>): boolean {
  return topology === 'non-inverting';
}

/** The ranking of resistors for a place in the circuit of the conditions. */
export function resistorRequest(
  { conditions, filter = {}, quantity }: RankingRequest,
  { r, rtol, vr }: SearchContent<typeof PLACE_KEYS>['values'],
): ResistorRankingRequest {
  const { ambientTemperature, band } = conditions;
  return {
    conditions: { resistance: r, resistanceTolerance: rtol, dcVoltage: vr, ambientTemperature, band },
    filter: resistorFilterOf(filter),
    quantity,
  };
}

/** Search and package name op-amps; which libraries, lifecycles and approvals count holds for all parts. */
function resistorFilterOf({ library, lifecycle, approval }: PartFilter): ResistorFilter {
  return {
    ...(library && { library }),
    ...(lifecycle && { lifecycle }),
    ...(approval && { approval }),
  };
}
