import { Injectable } from '@nestjs/common';
import type { ResistorPart } from '@roothertz/common/parts';
import type { PartFilters } from '../library/part-select.js';
import { ResistorStore } from '../library/resistor-store.service.js';
import type { Caller } from '../shared/access/caller.js';
import type { GapCountsDto } from './dto/gap-counts.dto.js';
import type {
  ListResistorsDto,
  ResistorFilterDto,
  ResistorMatchDto,
  ResistorOutcomeDto,
} from './dto/list-resistors.dto.js';
import type { ResistorListDto } from './dto/resistor-response.dto.js';
import type {
  ChangeMatchingDto,
  MatchingChangedDto,
  StandingOutcomeDto,
} from './dto/matching-standings.dto.js';
import { DuplicatesService } from './duplicates.service.js';
import { PartUsesService } from './part-uses.service.js';
import { PartsService } from './parts.service.js';

@Injectable()
export class ResistorsService extends PartsService<ResistorPart> {
  constructor(store: ResistorStore, uses: PartUsesService, duplicates: DuplicatesService) {
    super(store, uses, duplicates);
  }

  list(caller: Caller, { limit, offset, sort, ...dto }: ListResistorsDto): Promise<ResistorListDto> {
    return this.listParts(caller, { limit, offset, sort, ...filtersOf(dto) });
  }

  outcome(
    caller: Caller,
    { toLifecycle, toApproval, ...filter }: ResistorOutcomeDto,
  ): Promise<StandingOutcomeDto> {
    return this.standingOutcome(caller, filtersOf(filter), { toLifecycle, toApproval });
  }

  change(caller: Caller, filter: ResistorMatchDto, dto: ChangeMatchingDto): Promise<MatchingChangedDto> {
    return this.changeMatching(caller, filtersOf(filter), dto);
  }

  countGaps(caller: Caller, dto: ResistorFilterDto): Promise<GapCountsDto> {
    return this.store.countGaps(caller, filtersOf(dto));
  }
}

function filtersOf(dto: ResistorMatchDto): PartFilters {
  const { technology, resistanceFrom: from, resistanceTo: to, ...filters } = dto;
  return { ...filters, choice: technology, range: { key: 'resistance', from, to } };
}
