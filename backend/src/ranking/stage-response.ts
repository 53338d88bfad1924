import {
  type Network,
  type SoughtStage,
  type StageRanking,
  unsoughtPieces,
  type WholeStage,
} from '@roothertz/common/noise';
import type { ListedResistor } from '../library/listed-resistors.js';
import type {
  NetworkPartDto,
  RankedNetworkDto,
  StageRankingDto,
  WholeStageDto,
} from './dto/stage-ranking.dto.js';
import { type IndexedLibrary, revisionOf } from './library-index.service.js';
import { partAt, toPartName } from './part-at.js';
import type { StagePricing } from './stage-pricing.js';

/** What the stages of a ranking were made of. */
export interface StageSources {
  sought: SoughtStage;
  libraries: readonly IndexedLibrary[];
  resistors: readonly ListedResistor[];
  pricing: StagePricing;
}

export function toStageRanking(
  { items, frontier, ...ranking }: StageRanking,
  sources: StageSources,
): StageRankingDto {
  return {
    ...ranking,
    libraryRevision: revisionOf(sources.libraries),
    items: items.map((stage) => ({ rank: stage.rank, ...toWholeStage(stage, sources) })),
    frontier: frontier.map((stage) => toWholeStage(stage, sources)),
  };
}

function toWholeStage(stage: WholeStage, sources: StageSources): WholeStageDto {
  const { libraries, pricing, resistors, sought } = sources;
  const pieces = pricing.piecesOf(stage, sought.topology);
  return {
    part: partAt(stage, libraries),
    channelsInParallel: stage.channelsInParallel,
    network: toNetwork(stage.network, resistors),
    unitPrice: pricing.priceOf(pieces),
    pieces,
    unsought: unsoughtPieces(sought, stage.channelsInParallel),
    ...stage.figures,
  };
}

function toNetwork(
  { gain, gainResistor, feedbackResistor }: Network,
  resistors: readonly ListedResistor[],
): RankedNetworkDto {
  const partOf = (index: number | null): NetworkPartDto | null => {
    if (index === null) return null;
    const { resistance, tolerance, noiseIndex, technology } = resistors[index];
    return { ...toPartName(resistors[index]), resistance, tolerance, noiseIndex, technology };
  };
  return { gain, gainResistor: partOf(gainResistor), feedbackResistor: partOf(feedbackResistor) };
}
