import {
  checkStageSearch,
  rankStages,
  resistorFilterExclusion,
  STAGE_SEARCH_FIELDS,
  type SoughtConditions,
} from '@roothertz/common/noise';
import { Injectable } from '@nestjs/common';
import type { ListedResistor } from '../library/listed-resistors.js';
import type { Caller } from '../shared/access/caller.js';
import { refuseConditions, toPartFilter, toPlainConditions } from '../shared/conditions/ranking-request.js';
import type { RankStagesDto, SoughtConditionsDto } from './dto/rank-stages.dto.js';
import type { StageRankingDto } from './dto/stage-ranking.dto.js';
import { type IndexedLibrary, LibraryIndex } from './library-index.service.js';
import { PriceIndex } from './price-index.service.js';
import { StagePricing } from './stage-pricing.js';
import { toStageRanking } from './stage-response.js';

@Injectable()
export class StageRankingService {
  constructor(
    private readonly index: LibraryIndex,
    private readonly prices: PriceIndex,
  ) {}

  async rank(caller: Caller, dto: RankStagesDto): Promise<StageRankingDto> {
    const conditions = toSoughtConditions(dto.conditions);
    const filter = toPartFilter(dto.filter);
    refuseConditions(checkStageSearch(conditions, filter));
    const libraries = await this.index.opAmpsReadableBy(caller, filter);
    refuseMany(libraries, conditions);
    const resistors = await this.usableResistors(caller, dto);
    const pricing = new StagePricing(await this.prices.of(caller), dto.quantity, libraries, resistors);
    const { sort, within, limit, offset } = dto;
    const ranking = rankStages(
      { conditions, filter, sort, within, limit, offset, prices: pricing.ofParts() },
      libraries.map(({ columns }) => columns),
      resistors,
    );
    return toStageRanking(ranking, { sought: conditions.stage, libraries, resistors, pricing });
  }

  private async usableResistors(
    caller: Caller,
    { resistorFilter }: RankStagesDto,
  ): Promise<ListedResistor[]> {
    const libraries = await this.index.resistorsReadableBy(caller, resistorFilter);
    const words = (resistorFilter.search ?? '').toLowerCase().split(/\s+/).filter(Boolean);
    return libraries
      .flatMap(({ resistors }) => resistors)
      .filter(
        (resistor) =>
          resistorFilterExclusion(resistorFilter, resistor) === null &&
          words.every((word) => resistor.searchText.includes(word)),
      );
  }
}

const USUAL_MAXIMUM_TOTAL = 100_000;
const NO_LIMIT = STAGE_SEARCH_FIELDS['conditions.stage.network.maximumTotal'].bounds.to;

/** The one resistor of a transimpedance stage is near the wanted value, whatever that is. */
function toSoughtConditions(dto: SoughtConditionsDto): SoughtConditions {
  const conditions = toPlainConditions<SoughtConditions>(dto);
  const { topology, network } = dto.stage;
  const usual = topology === 'transimpedance' ? NO_LIMIT : USUAL_MAXIMUM_TOTAL;
  const { minimumTotal, maximumTotal = usual } = network;
  return { ...conditions, stage: { ...conditions.stage, network: { minimumTotal, maximumTotal } } };
}

const MOST_CANDIDATES = 10_000;

/**
 * Where the source drives the network and its impedance goes with frequency, each op-amp takes a search of its own:
 * more than some thousands would keep everybody waiting.
 */
function refuseMany(
  libraries: readonly IndexedLibrary[],
  { source, stage: { topology } }: SoughtConditions,
): void {
  const isReactive = source.inductance > 0 || source.capacitance > 0;
  if (!isReactive || (topology !== 'inverting' && topology !== 'difference')) return;
  const candidates = libraries.reduce((sum, { ids }) => sum + ids.length, 0);
  if (candidates <= MOST_CANDIDATES) return;
  const message = `at most ${MOST_CANDIDATES} op-amps can be searched for ${topology} stages on a source with inductance or capacitance: choose one library`;
  refuseConditions([{ field: 'filter.library', message }]);
}
