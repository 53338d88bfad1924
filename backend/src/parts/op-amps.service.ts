import { Injectable } from '@nestjs/common';
import type { OpAmpPart } from '@roothertz/common/parts';
import type { PartFilters } from '../library/part-select.js';
import { OpAmpStore } from '../library/op-amp-store.service.js';
import type { Caller } from '../shared/access/caller.js';
import type { GapCountsDto } from './dto/gap-counts.dto.js';
import type {
  ListOpAmpsDto,
  OpAmpFilterDto,
  OpAmpMatchDto,
  OpAmpOutcomeDto,
} from './dto/list-op-amps.dto.js';
import type { OpAmpListDto } from './dto/op-amp-response.dto.js';
import type {
  ChangeMatchingDto,
  MatchingChangedDto,
  StandingOutcomeDto,
} from './dto/matching-standings.dto.js';
import { DuplicatesService } from './duplicates.service.js';
import { PartUsesService } from './part-uses.service.js';
import { PartsService } from './parts.service.js';

@Injectable()
export class OpAmpsService extends PartsService<OpAmpPart> {
  constructor(store: OpAmpStore, uses: PartUsesService, duplicates: DuplicatesService) {
    super(store, uses, duplicates);
  }

  countGaps(caller: Caller, filter: OpAmpFilterDto): Promise<GapCountsDto> {
    return this.store.countGaps(caller, filtersOf(filter));
  }

  outcome(
    caller: Caller,
    { toLifecycle, toApproval, ...filter }: OpAmpOutcomeDto,
  ): Promise<StandingOutcomeDto> {
    return this.standingOutcome(caller, filtersOf(filter), { toLifecycle, toApproval });
  }

  change(caller: Caller, filter: OpAmpMatchDto, dto: ChangeMatchingDto): Promise<MatchingChangedDto> {
    return this.changeMatching(caller, filtersOf(filter), dto);
  }

  list(caller: Caller, { inputType, ...query }: ListOpAmpsDto): Promise<OpAmpListDto> {
    return this.listParts(caller, { ...query, choice: inputType });
  }
}

function filtersOf({ inputType, ...filter }: OpAmpMatchDto): PartFilters {
  return { ...filter, choice: inputType };
}
