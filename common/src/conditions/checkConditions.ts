import type { FieldError } from '../parts/index.js';
import { checkBandLimits, checkFields } from './checkFields.js';
import { CONDITION_FIELDS, type ConditionFieldPath } from './conditionFields.js';
import type { RankingRequest, StageConditions, Topology } from './conditions.js';

/** What any stage with a network of R_g and R_f may state of it. */
const NETWORK_FIELDS = ['outputVoltage', 'gainNoiseIndex', 'feedbackNoiseIndex', 'network'] as const;

/** The stage's fields that each topology has, and which of them it can't do without. */
export const STAGE_FIELDS = {
  'non-inverting': { required: ['gain'], optional: ['gainResistance', 'loadResistance', ...NETWORK_FIELDS] },
  inverting: { required: ['gain', 'gainResistance'], optional: ['biasResistance', ...NETWORK_FIELDS] },
  transimpedance: {
    required: ['feedbackResistance'],
    optional: ['feedbackCapacitance', 'outputVoltage', 'feedbackNoiseIndex', 'network'],
  },
  difference: { required: ['gain', 'gainResistance'], optional: NETWORK_FIELDS },
  instrumentation: {
    required: ['gain'],
    optional: ['gainResistance', 'loadResistance', 'differenceResistance', ...NETWORK_FIELDS],
  },
} as const satisfies Record<
  Topology,
  { required: readonly (keyof StageConditions)[]; optional: readonly (keyof StageConditions)[] }
>;

/**
 * Everything that is wrong with a ranking request, field by field: values out of bounds, fields that
 * the topology needs or doesn't have, limits that contradict each other. Empty = it can be ranked.
 */
export function checkConditions(request: RankingRequest): FieldError[] {
  const bounds = checkBounds(request);
  return bounds.length > 0
    ? bounds
    : [...checkStage(request), ...checkBand(request), ...checkSupply(request)];
}

const AUTOMATIC = 'conditions.stage.feedbackCapacitance' satisfies ConditionFieldPath;

/** “auto” isn't a number, but the one word that stands for a number. */
function checkBounds(request: RankingRequest): FieldError[] {
  const isAutomatic = request.conditions.stage.feedbackCapacitance === 'auto';
  return checkFields(CONDITION_FIELDS, request).filter(({ field }) => !isAutomatic || field !== AUTOMATIC);
}

function checkStage({ conditions }: RankingRequest): FieldError[] {
  const { stage, source } = conditions;
  const { required, optional } = STAGE_FIELDS[stage.topology];
  const allowed: readonly string[] = ['topology', ...required, ...optional];
  const errors: FieldError[] = [];
  const add = (field: string, message: string) => errors.push({ field: `conditions.${field}`, message });
  for (const key of required) {
    if (stage[key as keyof StageConditions] === undefined)
      add(`stage.${key}`, `${article(stage.topology)} stage needs this value`);
  }
  for (const [key, value] of Object.entries(stage)) {
    if (value !== undefined && !allowed.includes(key))
      add(`stage.${key}`, `${article(stage.topology)} stage doesn’t have this: leave it out`);
  }
  if (stage.topology === 'non-inverting' || stage.topology === 'instrumentation') {
    checkFollowing(stage, add);
    checkLosses(source, stage, add);
  }
  const hasSeries = stage.topology === 'inverting' || stage.topology === 'difference';
  if (hasSeries && source.resistance + (stage.gainResistance ?? 0) <= 0)
    add('stage.gainResistance', 'gain resistance and source resistance can’t both be 0 Ω');
  if (stage.topology === 'transimpedance') checkCurrentSource(source, add);
  else if (source.directCurrent)
    add('source.directCurrent', 'only a transimpedance stage has a detector’s direct current: leave it out');
  return errors;
}

type AddError = (field: string, message: string) => void;

/** Amplifiers that follow the source with their + inputs. */
function checkFollowing(stage: StageConditions, add: AddError): void {
  if (stage.gain === undefined) return;
  if (stage.gain < 1) add('stage.gain', `gain: ${article(stage.topology)} stage has a gain of 1 or more`);
  if (stage.gain > 1 && !stage.gainResistance)
    add('stage.gainResistance', 'gain resistance: a value above 0 Ω is needed where the gain is above 1');
}

/** Without any loss, the resonance of the coil with the capacitance across it has an infinite peak. */
function checkLosses(
  { resistance, inductance }: RankingRequest['conditions']['source'],
  { loadResistance }: StageConditions,
  add: AddError,
): void {
  if (resistance === 0 && inductance > 0 && loadResistance === undefined)
    add('source.resistance', 'source resistance: a coil has one above 0 Ω, or give it a load resistance');
}

function checkCurrentSource(source: RankingRequest['conditions']['source'], add: AddError): void {
  if (source.resistance <= 0)
    add('source.resistance', 'source resistance: a current source needs a resistance above 0 Ω across it');
  if (source.inductance > 0)
    add('source.inductance', 'source inductance: a current source has none, set it to 0 H');
}

function article(topology: Topology): string {
  return topology.startsWith('in') ? `an ${topology}` : `a ${topology}`;
}

function checkBand({ conditions: { band, referenceFrequency } }: RankingRequest): FieldError[] {
  const limits = checkBandLimits(band);
  if (limits.length > 0) return limits;
  if (referenceFrequency < band.lower || referenceFrequency > band.upper)
    return [
      {
        field: 'conditions.referenceFrequency',
        message: 'reference frequency: a frequency inside the band was expected',
      },
    ];
  return [];
}

function checkSupply({ filter }: RankingRequest): FieldError[] {
  if (!filter?.supply || filter.supply.maximum >= filter.supply.minimum) return [];
  return [{ field: 'filter.supply.maximum', message: 'supply, highest: not below the lowest supply' }];
}
