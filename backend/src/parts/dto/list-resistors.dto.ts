import {
  gapFields,
  type QuantityField,
  RESISTOR_CATALOGUE,
  RESISTOR_PARAMETERS,
  TECHNOLOGIES,
  type Technology,
} from '@roothertz/common/parts';
import { Type } from 'class-transformer';
import { IntersectionType, OmitType } from '@nestjs/swagger';
import { Options } from '../../shared/validation/option.decorator.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { IN_QUERY, ListPartsDto } from './list-parts.dto.js';
import { WantedStandingDto } from './matching-standings.dto.js';

const RESISTANCE: QuantityField = RESISTOR_PARAMETERS[0];
const FROM = { ...RESISTANCE, label: 'resistance from', help: 'The least value that the list holds.' };
const TO = { ...RESISTANCE, label: 'resistance to', help: 'The greatest value that the list holds.' };

const MISSING = gapFields(RESISTOR_CATALOGUE).map(({ key }) => key);

export class ListResistorsDto extends ListPartsDto {
  @Options(TECHNOLOGIES, IN_QUERY)
  technology?: Technology[];

  @Type(() => Number)
  @Quantity(FROM, { optional: true })
  resistanceFrom?: number;

  @Type(() => Number)
  @Quantity(TO, { optional: true })
  resistanceTo?: number;

  @Options(MISSING, IN_QUERY)
  missing?: string[];
}

/** Which resistors are meant, as the list narrows them. */
export class ResistorMatchDto extends OmitType(ListResistorsDto, ['limit', 'offset', 'sort']) {}

export class ResistorOutcomeDto extends IntersectionType(ResistorMatchDto, WantedStandingDto) {}

/** What narrows the parts whose gaps are counted. */
export class ResistorFilterDto extends OmitType(ListResistorsDto, ['limit', 'offset', 'sort', 'missing']) {}
