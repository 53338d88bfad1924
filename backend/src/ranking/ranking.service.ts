import {
  checkAmplifier,
  evaluateStage,
  exclusionDetail,
  type ExcludedPart,
  findExcluded,
  PRICED_RANKING_SORTS,
  rankAmplifiers,
} from '@roothertz/common/noise';
import type { RankingRequest } from '@roothertz/common/conditions';
import { type Amplifier, OP_AMP_PARAMETERS } from '@roothertz/common/parts';
import { Injectable } from '@nestjs/common';
import type { Caller } from '../shared/access/caller.js';
import { checkedConditions, checkedRankingRequest } from '../shared/conditions/ranking-request.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { parseSort } from '../shared/list/sort.js';
import { withFallbacks } from '../shared/parts/parameter-dtos.js';
import type { EvaluateStageDto } from './dto/evaluate-stage.dto.js';
import type { ExclusionDto, ExclusionListDto } from './dto/exclusions-response.dto.js';
import type { RankOpAmpsDto } from './dto/rank-op-amps.dto.js';
import type { RankingResponseDto } from './dto/ranking-response.dto.js';
import type { StageFiguresDto } from './dto/stage-figures.dto.js';
import { type IndexedLibrary, LibraryIndex } from './library-index.service.js';
import { partNameAt } from './part-at.js';
import { PriceIndex } from './price-index.service.js';
import { toRankingResponse } from './ranking-response.js';

@Injectable()
export class RankingService {
  constructor(
    private readonly index: LibraryIndex,
    private readonly prices: PriceIndex,
  ) {}

  async rank(caller: Caller, dto: RankOpAmpsDto): Promise<RankingResponseDto> {
    const request = checkedRankingRequest(dto);
    const { key: sort, descending } = parseSort(dto.sort, PRICED_RANKING_SORTS);
    const { limit, offset } = dto;
    const [libraries, prices] = await Promise.all([
      this.index.opAmpsReadableBy(caller, request.filter),
      this.prices.at(caller, request.quantity),
    ]);
    const totals = libraries.map(({ ids }) => prices.totals(ids));
    const ranking = rankAmplifiers(
      { ...request, sort, descending, limit, offset, prices: totals },
      libraries.map(({ columns }) => columns),
    );
    return toRankingResponse(ranking, libraries, prices);
  }

  async exclusions(caller: Caller, dto: RankOpAmpsDto): Promise<ExclusionListDto> {
    const request = checkedRankingRequest(dto);
    const libraries = await this.index.opAmpsReadableBy(caller, request.filter);
    const { items, total } = findExcluded(
      request,
      libraries.map(({ columns }) => columns),
      dto,
    );
    return { items: items.map((part) => toExclusion(part, request, libraries)), total };
  }

  stage(dto: EvaluateStageDto): StageFiguresDto {
    const conditions = checkedConditions(dto.conditions);
    const amplifier = withFallbacks<Amplifier>(OP_AMP_PARAMETERS, dto.amplifier);
    const errors = checkAmplifier(conditions, amplifier);
    if (errors.length > 0)
      throw new DomainError('conditions.invalid', 'The noise of this stage has no end.', { errors });
    return evaluateStage(conditions, amplifier);
  }
}

function toExclusion(
  { library, row, reason }: ExcludedPart,
  { conditions, filter }: Required<RankingRequest>,
  libraries: readonly IndexedLibrary[],
): ExclusionDto {
  const { columns } = libraries[library];
  const part = partNameAt({ library, row }, libraries);
  return { part, reason, detail: exclusionDetail(reason, conditions, filter, columns, row) };
}
