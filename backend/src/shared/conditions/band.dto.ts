import { type BandConditions, CONDITION_FIELDS } from '@roothertz/common/conditions';
import { Quantity } from '../validation/quantity.decorator.js';

export class BandDto implements BandConditions {
  @Quantity(CONDITION_FIELDS['conditions.band.lower'])
  lower: number;

  @Quantity(CONDITION_FIELDS['conditions.band.upper'])
  upper: number;

  @Quantity(CONDITION_FIELDS['conditions.band.lowPassOrder'], { optional: true })
  lowPassOrder: number = 0;
}
