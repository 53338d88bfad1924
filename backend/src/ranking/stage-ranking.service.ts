import {
  checkStageSearch,
  type Network,
  type RankedStage,
  rankStages,
  resistorFilterExclusion,
  type SoughtConditions,
} from '@roothertz/common/noise';
import { Injectable } from '@nestjs/common';
import { LibraryService } from '../library/library.service.js';
import type { ListedResistor } from '../library/listed-resistors.js';
import type { OpAmpPart } from '@roothertz/common/parts';
import type { PartRecord } from '../library/part-record.js';
import type { Caller } from '../shared/access/caller.js';
import { refuseConditions, toPartFilter, toPlainConditions } from '../shared/conditions/ranking-request.js';
import type { RankStagesDto } from './dto/rank-stages.dto.js';
import type {
  NetworkPartDto,
  RankedNetworkDto,
  RankedStageDto,
  StageRankingDto,
} from './dto/stage-ranking.dto.js';
import { type IndexedLibrary, LibraryIndex, revisionOf } from './library-index.service.js';
import { toPartName } from './part-name-at.js';
import { countReasons } from './ranking-response.js';

@Injectable()
export class StageRankingService {
  constructor(
    private readonly index: LibraryIndex,
    private readonly library: LibraryService,
  ) {}

  async rank(caller: Caller, dto: RankStagesDto): Promise<StageRankingDto> {
    const conditions = toPlainConditions<SoughtConditions>(dto.conditions);
    const filter = toPartFilter(dto.filter);
    refuseConditions(checkStageSearch(conditions, filter));
    const libraries = await this.index.opAmpsReadableBy(caller, filter);
    refuseMany(libraries, conditions);
    const resistors = await this.usableResistors(caller, dto);
    const { limit, offset } = dto;
    const columns = libraries.map((library) => library.columns);
    const ranking = rankStages({ conditions, filter, limit, offset }, columns, resistors);
    const idOf = ({ library, row }: RankedStage) => libraries[library].ids[row];
    const records = await this.library.findOpAmps(caller, ranking.items.map(idOf));
    const byId = new Map(records.map((record) => [record.id, record]));
    return {
      ...ranking,
      excluded: countReasons(ranking.excluded),
      libraryRevision: revisionOf(libraries),
      items: ranking.items.flatMap((stage) => {
        const record = byId.get(idOf(stage));
        return record === undefined ? [] : [toRankedStage(stage, record, resistors)];
      }),
    };
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

const MOST_CANDIDATES = 5000;

/** Each op-amp and number of channels is a search of its own: more than a few thousand keep everybody waiting. */
function refuseMany(libraries: readonly IndexedLibrary[], { stage }: SoughtConditions): void {
  const candidates = libraries.reduce((sum, { ids }) => sum + ids.length, 0) * stage.parallelMaximum;
  if (candidates <= MOST_CANDIDATES) return;
  const message = `at most ${MOST_CANDIDATES} op-amps, counted for each number of channels, can be searched: choose one library or fewer channels in parallel`;
  refuseConditions([{ field: 'filter.library', message }]);
}

function toRankedStage(
  { rank, channelsInParallel, network, figures }: RankedStage,
  record: PartRecord<OpAmpPart>,
  resistors: readonly ListedResistor[],
): RankedStageDto {
  const { amplifier, origins } = record;
  const part = { ...toPartName(record), amplifier, origins };
  return { rank, part, channelsInParallel, network: toNetwork(network, resistors), ...figures };
}

function toNetwork(
  { gain, gainResistor, feedbackResistor }: Network,
  resistors: readonly ListedResistor[],
): RankedNetworkDto {
  const partOf = (index: number | null): NetworkPartDto | null =>
    index === null ? null : { ...toPartName(resistors[index]), resistance: resistors[index].resistance };
  return { gain, gainResistor: partOf(gainResistor), feedbackResistor: partOf(feedbackResistor) };
}
