import type { RankingRequest } from '@roothertz/common/conditions';
import { evaluateStage, sourceFloor } from '@roothertz/common/noise';
import type { Amplifier } from '@roothertz/common/parts';
import type { Ranking, RankingItem } from '../api/ranking';
import { opAmp } from './factories';

/** A ranked part with the figures that the stage truly has. */
export function rankedItem(
  request: RankingRequest,
  rank: number,
  partNumber: string,
  amplifier: Partial<Amplifier> = {},
): RankingItem {
  const { id: _id, description: _description, version: _version, updatedAt: _updatedAt, ...part } = opAmp();
  const figures = evaluateStage(request.conditions, { ...part.amplifier, ...amplifier }, request.filter);
  const limit = request.target?.inputNoiseRms;
  return {
    ...figures,
    rank,
    part: { ...part, id: String(rank), partNumber, amplifier: { ...part.amplifier, ...amplifier } },
    quietSet: rank === 1,
    meetsTarget: limit === undefined ? null : figures.inputNoiseRms <= limit,
    unitPrice: null,
  };
}

/** The server's answer with these items and nothing else. */
export function rankingOf(
  request: RankingRequest,
  items: RankingItem[],
  more: Partial<Ranking> = {},
): Ranking {
  return {
    total: items.length,
    excluded: { total: 0, reasons: [] },
    quietSet: { total: 1 },
    floor: sourceFloor(request.conditions),
    libraryRevision: '1.1',
    cheapest: null,
    frontier: [],
    items,
    ...more,
  };
}
