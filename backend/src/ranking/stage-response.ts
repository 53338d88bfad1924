import type { Network, StageRanking, WholeStage } from '@roothertz/common/noise';
import type { Topology } from '@roothertz/common/conditions';
import type { ListedResistor } from '../library/listed-resistors.js';
import type { OpAmpRecord } from '../library/part-record.js';
import type {
  NetworkPartDto,
  RankedNetworkDto,
  StageRankingDto,
  WholeStageDto,
} from './dto/stage-ranking.dto.js';
import { type IndexedLibrary, revisionOf } from './library-index.service.js';
import { toPartName } from './part-name-at.js';
import { countReasons } from './ranking-response.js';
import type { StagePricing } from './stage-pricing.js';

/** What the stages of a ranking were made of. */
export interface StageSources {
  topology: Topology;
  libraries: readonly IndexedLibrary[];
  resistors: readonly ListedResistor[];
  records: ReadonlyMap<number, OpAmpRecord>;
  pricing: StagePricing;
}

/** Stages whose op-amp is gone since they were ranked are left out. */
export function toStageRanking(
  { items, frontier, excluded, ...ranking }: StageRanking,
  sources: StageSources,
): StageRankingDto {
  return {
    ...ranking,
    excluded: countReasons(excluded),
    libraryRevision: revisionOf(sources.libraries),
    items: items.flatMap((stage) =>
      toWholeStage(stage, sources).map((whole) => ({ rank: stage.rank, ...whole })),
    ),
    frontier: frontier.flatMap((stage) => toWholeStage(stage, sources)),
  };
}

function toWholeStage(stage: WholeStage, sources: StageSources): WholeStageDto[] {
  const { libraries, records, pricing, resistors, topology } = sources;
  const record = records.get(libraries[stage.library].ids[stage.row]);
  if (record === undefined) return [];
  const { amplifier, origins } = record;
  const pieces = pricing.piecesOf(stage, topology);
  return [
    {
      part: { ...toPartName(record), amplifier, origins },
      channelsInParallel: stage.channelsInParallel,
      network: toNetwork(stage.network, resistors),
      unitPrice: pricing.priceOf(pieces),
      pieces,
      ...stage.figures,
    },
  ];
}

function toNetwork(
  { gain, gainResistor, feedbackResistor }: Network,
  resistors: readonly ListedResistor[],
): RankedNetworkDto {
  const partOf = (index: number | null): NetworkPartDto | null => {
    if (index === null) return null;
    const { resistance, noiseIndex, technology } = resistors[index];
    return { ...toPartName(resistors[index]), resistance, noiseIndex, technology };
  };
  return { gain, gainResistor: partOf(gainResistor), feedbackResistor: partOf(feedbackResistor) };
}
