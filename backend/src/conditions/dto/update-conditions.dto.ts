import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { OperatingConditionsDto } from '../../shared/conditions/operating-conditions.dto.js';
import { PartFilterDto } from '../../shared/conditions/part-filter.dto.js';
import { RankingTargetDto } from '../../shared/conditions/ranking-request.dto.js';
import { Ids } from '../../shared/validation/id.decorator.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';
import { CONDITIONS_NAME, MOST_PARTS } from './conditions-fields.js';

/** A change of saved conditions: each of its parts is replaced whole, and what is left out stays. */
export class UpdateConditionsDto {
  @Version()
  version: number;

  @StoredText(CONDITIONS_NAME, { optional: true })
  name?: string;

  @Nested(() => OperatingConditionsDto, { optional: true })
  conditions?: OperatingConditionsDto;

  @Nested(() => PartFilterDto, { optional: true })
  filter?: PartFilterDto;

  @Nested(() => RankingTargetDto, { optional: true })
  target?: RankingTargetDto;

  @Quantity(CONDITION_FIELDS.quantity, { optional: true })
  quantity?: number;

  @Ids(MOST_PARTS, { least: 0, optional: true })
  partIds?: string[];
}
