import { CONDITION_FIELDS, type RankingTarget } from '@roothertz/common/conditions';
import { Nested } from '../validation/nested.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';
import { OperatingConditionsDto } from './operating-conditions.dto.js';
import { PartFilterDto } from './part-filter.dto.js';

export class RankingTargetDto implements RankingTarget {
  @Quantity(CONDITION_FIELDS['target.inputNoiseRms'], { optional: true })
  inputNoiseRms?: number;
}

/** What a ranking is asked with and what named conditions hold. */
export class RankingRequestDto {
  @Nested(() => OperatingConditionsDto)
  conditions: OperatingConditionsDto;

  @Nested(() => PartFilterDto, { optional: true })
  filter: PartFilterDto = new PartFilterDto();

  @Nested(() => RankingTargetDto, { optional: true })
  target: RankingTargetDto = new RankingTargetDto();

  @Quantity(CONDITION_FIELDS.quantity, { optional: true })
  quantity: number = 1;
}
