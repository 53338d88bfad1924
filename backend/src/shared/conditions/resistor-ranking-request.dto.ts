import {
  RESISTOR_CONDITION_FIELDS,
  type ResistorConditions,
  type ResistorFilter,
} from '@roothertz/common/conditions';
import { TECHNOLOGIES, type Technology } from '@roothertz/common/parts';
import { Nested } from '../validation/nested.decorator.js';
import { Options } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';
import { BandDto } from './band.dto.js';
import { LibraryFilterDto } from './library-filter.dto.js';

export class ResistorConditionsDto implements ResistorConditions {
  @Quantity(RESISTOR_CONDITION_FIELDS['conditions.resistance'])
  resistance: number;

  @Quantity(RESISTOR_CONDITION_FIELDS['conditions.resistanceTolerance'], { optional: true })
  resistanceTolerance: number = 0.02;

  @Quantity(RESISTOR_CONDITION_FIELDS['conditions.dcVoltage'], { optional: true })
  dcVoltage: number = 0;

  @Quantity(RESISTOR_CONDITION_FIELDS['conditions.ambientTemperature'], { optional: true })
  ambientTemperature: number = 298.15;

  @Nested(() => BandDto)
  band: BandDto;
}

export class ResistorFilterDto extends LibraryFilterDto implements ResistorFilter {
  @Options(TECHNOLOGIES, { optional: true })
  technology?: Technology[];

  @Quantity(RESISTOR_CONDITION_FIELDS['filter.tolerance'], { optional: true })
  tolerance?: number;
}

/** What resistors are ranked by. */
export class ResistorRankingRequestDto {
  @Nested(() => ResistorConditionsDto)
  conditions: ResistorConditionsDto;

  @Nested(() => ResistorFilterDto, { optional: true })
  filter: ResistorFilterDto = new ResistorFilterDto();

  @Quantity(RESISTOR_CONDITION_FIELDS.quantity, { optional: true })
  quantity: number = 1;
}
