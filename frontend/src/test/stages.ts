import { evaluateStage, sourceFloor } from '@roothertz/common/noise';
import type { ResistorItem, ResistorRanking } from '../api/resistorRanking';
import type { StageItem, StageRanking, StageRequest } from '../api/stages';
import { opAmp, resistor } from './factories';

/** A ranked stage of gain 101 with 5 Ω and 500 Ω. */
export function rankedStage(request: StageRequest, rank: number, partNumber: string): StageItem {
  const { gainTolerance: _tolerance, parallelMaximum: _most, network, ...stage } = request.conditions.stage;
  const { id: _id, description: _description, version: _version, updatedAt: _updatedAt, ...part } = opAmp();
  const conditions = {
    ...request.conditions,
    stage: { ...stage, gain: 101, gainResistance: 5, network: { minimumTotal: network.minimumTotal } },
  };
  return {
    ...evaluateStage(conditions, part.amplifier),
    rank,
    part: { ...part, id: String(rank), partNumber },
    channelsInParallel: 1,
    network: {
      gain: 101,
      gainResistor: networkPart('901', 'TN-5R00', 5),
      feedbackResistor: networkPart('902', 'TN-500R', 500),
    },
    unitPrice: null,
    pieces: [
      { places: ['op-amp'], pieces: 1, unitPrice: null },
      { places: ['gain'], pieces: 1, unitPrice: null },
      { places: ['feedback'], pieces: 1, unitPrice: null },
    ],
    unsought: [],
  };
}

function networkPart(id: string, partNumber: string, resistance: number) {
  const { description: _description, version: _version, updatedAt: _updatedAt, ...part } = resistor();
  const { resistor: parameters, origins: _origins, ...name } = part;
  const { noiseIndex, technology, tolerance } = parameters;
  return { ...name, id, partNumber, resistance, noiseIndex, technology, tolerance };
}

/** The server's answer with these stages. */
export function stageRankingOf(
  request: StageRequest,
  items: StageItem[],
  more: Partial<StageRanking> = {},
): StageRanking {
  const { gainTolerance: _tolerance, parallelMaximum: _most, ...stage } = request.conditions.stage;
  return {
    total: items.length,
    excluded: { total: 0, reasons: [] },
    floor: sourceFloor({ ...request.conditions, stage }),
    pairs: 1234,
    nearestGain: 100,
    evaluations: { made: 10, exhaustive: 1000 },
    libraryRevision: '1.1',
    items,
    frontier: [],
    ...more,
  };
}

export function rankedResistor(
  rank: number,
  partNumber: string,
  changes: Partial<ResistorItem> = {},
): ResistorItem {
  const { description: _description, version: _version, updatedAt: _updatedAt, ...part } = resistor();
  return {
    rank,
    part: { ...part, id: String(60 + rank), partNumber },
    thermalRms: 100e-9,
    excessRms: 0,
    totalRms: 100e-9,
    aboveThermal: 0,
    dissipation: 4e-3,
    temperature: 300,
    cautions: [],
    unitPrice: null,
    ...changes,
  };
}

export function resistorRankingOf(
  items: ResistorItem[],
  more: Partial<ResistorRanking> = {},
): ResistorRanking {
  return {
    total: items.length,
    excluded: { total: 0, reasons: [] },
    libraryRevision: '1.1',
    items,
    ...more,
  };
}
