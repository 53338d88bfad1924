import { CONDITION_FIELDS, type SourceConditions } from '@roothertz/common/conditions';
import { Quantity } from '../validation/quantity.decorator.js';

export class SourceDto implements SourceConditions {
  @Quantity(CONDITION_FIELDS['conditions.source.resistance'])
  resistance: number;

  @Quantity(CONDITION_FIELDS['conditions.source.inductance'], { optional: true })
  inductance: number = 0;

  @Quantity(CONDITION_FIELDS['conditions.source.capacitance'], { optional: true })
  capacitance: number = 0;

  @Quantity(CONDITION_FIELDS['conditions.source.temperature'], { optional: true })
  temperature?: number;

  @Quantity(CONDITION_FIELDS['conditions.source.directCurrent'], { optional: true })
  directCurrent?: number;
}
