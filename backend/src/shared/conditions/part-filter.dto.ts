import { CONDITION_FIELDS, type PartFilter } from '@roothertz/common/conditions';
import {
  type Approval,
  APPROVALS,
  INPUT_TYPES,
  type InputType,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import { Nested } from '../validation/nested.decorator.js';
import { Options } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';
import { Text } from '../validation/text.decorator.js';

export class SupplyDto {
  @Quantity(CONDITION_FIELDS['filter.supply.minimum'])
  minimum: number;

  @Quantity(CONDITION_FIELDS['filter.supply.maximum'])
  maximum: number;
}

export class PartFilterDto implements PartFilter {
  @Text({ label: 'search', maxLength: 200, optional: true })
  search?: string;

  @Options(LIBRARIES, { optional: true })
  library?: Library[];

  @Options(LIFECYCLES, { optional: true })
  lifecycle?: Lifecycle[];

  @Options(APPROVALS, { optional: true })
  approval?: Approval[];

  @Options(INPUT_TYPES, { optional: true })
  inputType?: InputType[];

  @Quantity(CONDITION_FIELDS['filter.channels'], { optional: true })
  channels?: number;

  @Text({ label: 'package', maxLength: 60, optional: true })
  package?: string;

  @Nested(() => SupplyDto, { optional: true })
  supply?: SupplyDto;
}
