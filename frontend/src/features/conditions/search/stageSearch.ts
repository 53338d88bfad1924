import type {
  PartFilter,
  RankingRequest,
  ResistorFilter,
  ResistorRankingRequest,
  StageConditions,
} from '@roothertz/common/conditions';
import { STAGE_SEARCH_FIELDS, type SoughtConditions, type StageSort } from '@roothertz/common/noise';
import type { Technology } from '@roothertz/common/parts';
import type { SearchContent } from './searchAddress';
import type { PLACE_KEYS, STAGE_SEARCH_KEYS } from './searchKeys';

/** Ω, what an output drives where nothing else is stated (common practice, no source). */
const USUAL_MINIMUM_TOTAL = 500;

/** Which resistors count. */
export interface ResistorChoices {
  technologies: readonly Technology[];
  /** at most so wide; null = any */
  tolerance: number | null;
}

export interface StageChoices extends ResistorChoices {
  sort: StageSort;
}

/** The search for whole stages at the conditions: the network's resistors are what is to be found. */
export function stageRequest(
  { conditions, filter = {}, quantity }: RankingRequest,
  { gtol, nmax, par, within }: SearchContent<typeof STAGE_SEARCH_KEYS>['values'],
  { sort, ...choices }: StageChoices,
) {
  const { network, ...stage } = withoutNetwork(conditions.stage);
  const minimumTotal = network?.minimumTotal ?? USUAL_MINIMUM_TOTAL;
  const sought: SoughtConditions = {
    ...conditions,
    stage: {
      ...stage,
      gainTolerance: gtol,
      network: { minimumTotal, maximumTotal: isNetworkLimited(stage) ? nmax : NO_LIMIT },
      parallelMaximum: canBeParallel(stage) ? par : 1,
    },
  };
  return {
    conditions: sought,
    filter,
    resistorFilter: resistorFilterOf(filter, choices),
    quantity,
    sort,
    ...(sort === 'unitPrice' && { within }),
  };
}

type Sought = Omit<StageConditions, 'gainResistance' | 'gainNoiseIndex' | 'feedbackNoiseIndex'>;

/** R_g, and which resistors make it and R_f, is what is sought. */
function withoutNetwork({
  gainResistance: _sought,
  gainNoiseIndex: _ofGain,
  feedbackNoiseIndex: _ofFeedback,
  ...stage
}: StageConditions): Sought {
  return stage;
}

const NO_LIMIT = STAGE_SEARCH_FIELDS['conditions.stage.network.maximumTotal'].bounds.to;

/** The one resistor of a transimpedance stage is near the wanted value, whatever that is. */
export function isNetworkLimited({ topology }: Pick<StageConditions, 'topology'>): boolean {
  return topology !== 'transimpedance';
}

/** Elsewhere the source sees the networks of joined channels, and the gain isn't that of one. */
export function canBeParallel({ topology }: Pick<StageConditions, 'topology'>): boolean {
  return topology === 'non-inverting';
}

/** The ranking of resistors for a place in the circuit of the conditions. */
export function resistorRequest(
  { conditions, filter = {}, quantity }: RankingRequest,
  { r, rtol, vr }: SearchContent<typeof PLACE_KEYS>['values'],
  choices: ResistorChoices,
): ResistorRankingRequest {
  const { ambientTemperature, band } = conditions;
  return {
    conditions: { resistance: r, resistanceTolerance: rtol, dcVoltage: vr, ambientTemperature, band },
    filter: resistorFilterOf(filter, choices),
    quantity,
  };
}

/** Search and package name op-amps; which libraries, lifecycles and approvals count holds for all parts. */
function resistorFilterOf(
  { library, lifecycle, approval }: PartFilter,
  { technologies, tolerance }: ResistorChoices,
): ResistorFilter {
  return {
    ...(technologies.length > 0 && { technology: [...technologies] }),
    ...(tolerance !== null && { tolerance }),
    ...(library && { library }),
    ...(lifecycle && { lifecycle }),
    ...(approval && { approval }),
  };
}
