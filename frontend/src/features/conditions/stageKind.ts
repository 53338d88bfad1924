import { STAGE_FIELDS, type RankingRequest, type StageConditions } from '@roothertz/common/conditions';

/** The stages that the schematic draws: the topologies, and the follower, which is a special case of one. */
export const STAGE_KINDS = [
  'non-inverting',
  'follower',
  'inverting',
  'transimpedance',
  'difference',
  'instrumentation',
] as const;
export type StageKind = (typeof STAGE_KINDS)[number];

export const STAGE_KIND_LABELS: Record<StageKind, string> = {
  'non-inverting': 'Non-inverting',
  follower: 'Follower',
  inverting: 'Inverting',
  transimpedance: 'Transimpedance',
  difference: 'Difference',
  instrumentation: 'Instrumentation',
};

/** What a stage starts with where the one before it had no such value. */
export const STAGE_DEFAULTS: Record<StageKind, StageConditions> = {
  'non-inverting': { topology: 'non-inverting', gain: 100, gainResistance: 10 },
  follower: { topology: 'non-inverting', gain: 1 },
  inverting: { topology: 'inverting', gain: 10, gainResistance: 1000 },
  transimpedance: { topology: 'transimpedance', feedbackResistance: 1e6, feedbackCapacitance: 'auto' },
  difference: { topology: 'difference', gain: 10, gainResistance: 1000 },
  instrumentation: { topology: 'instrumentation', gain: 100, gainResistance: 100 },
};

export function stageKindOf({ topology, gain, gainResistance }: StageConditions): StageKind {
  return topology === 'non-inverting' && gain === 1 && !gainResistance ? 'follower' : topology;
}

/** Whether a stage of this kind has the field, such as `gain`. */
export function hasStageField(kind: StageKind, field: string): boolean {
  if (kind === 'follower') return field === 'loadResistance';
  const { required, optional } = STAGE_FIELDS[kind];
  return ([...required, ...optional] as string[]).includes(field);
}

/** The same source, band and limits with another stage, which keeps the values that it can use. */
export function withStageKind(request: RankingRequest, kind: StageKind): RankingRequest {
  const { conditions } = request;
  const kept = Object.entries(conditions.stage).filter(([field]) => hasStageField(kind, field));
  const stage = { ...STAGE_DEFAULTS[kind], ...Object.fromEntries(kept), ...fixedBy(kind) } as StageConditions;
  const mustAmplify = kind === 'non-inverting' || kind === 'instrumentation';
  if (mustAmplify && stage.gain! <= 1) stage.gain = STAGE_DEFAULTS[kind].gain;
  return { ...request, conditions: { ...conditions, stage, source: sourceFor(request, kind) } };
}

function fixedBy(kind: StageKind): Partial<StageConditions> {
  return { topology: STAGE_DEFAULTS[kind].topology };
}

function sourceFor({ conditions: { source } }: RankingRequest, kind: StageKind) {
  const { directCurrent, ...others } = source;
  if (kind !== 'transimpedance') return others;
  const current = directCurrent === undefined ? {} : { directCurrent };
  return { ...others, ...current, inductance: 0, resistance: source.resistance || 1e6 };
}
