import { CONDITION_FIELDS, type PartFilter } from '@roothertz/common/conditions';
import { INPUT_TYPES, type InputType } from '@roothertz/common/parts';
import { Nested } from '../validation/nested.decorator.js';
import { Options } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';
import { LibraryFilterDto } from './library-filter.dto.js';

export class SupplyDto {
  @Quantity(CONDITION_FIELDS['filter.supply.minimum'])
  minimum: number;

  @Quantity(CONDITION_FIELDS['filter.supply.maximum'])
  maximum: number;
}

export class PartFilterDto extends LibraryFilterDto implements PartFilter {
  @Options(INPUT_TYPES, { optional: true })
  inputType?: InputType[];

  @Quantity(CONDITION_FIELDS['filter.channels'], { optional: true })
  channels?: number;

  @Nested(() => SupplyDto, { optional: true })
  supply?: SupplyDto;
}
