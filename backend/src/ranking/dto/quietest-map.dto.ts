import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import type { MapAxis } from '@roothertz/common/noise';
import type { QuantityField } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { OperatingConditionsDto } from '../../shared/conditions/operating-conditions.dto.js';
import { PartFilterDto } from '../../shared/conditions/part-filter.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';

const STEPS: QuantityField = {
  label: 'steps',
  kind: 'count',
  integer: true,
  bounds: { from: 2, to: 100 },
  help: 'Points of the axis, both ends included, in equal factors.',
};
const RESISTANCE: QuantityField = {
  ...CONDITION_FIELDS['conditions.source.resistance'],
  bounds: { above: 0, to: 1e13 },
};
const FREQUENCY = CONDITION_FIELDS['conditions.referenceFrequency'];

export class ResistanceAxisDto implements MapAxis {
  @Quantity(RESISTANCE)
  from: number;

  @Quantity(RESISTANCE)
  to: number;

  @Quantity(STEPS)
  steps: number;
}

export class FrequencyAxisDto implements MapAxis {
  @Quantity(FREQUENCY)
  from: number;

  @Quantity(FREQUENCY)
  to: number;

  @Quantity(STEPS)
  steps: number;
}

/** What the map is drawn for; source resistance and frequency of the conditions give way to the axes. */
export class QuietestMapDto {
  @Nested(() => OperatingConditionsDto)
  conditions: OperatingConditionsDto;

  @Nested(() => PartFilterDto, { optional: true })
  filter: PartFilterDto = new PartFilterDto();

  @Nested(() => ResistanceAxisDto)
  resistance: ResistanceAxisDto;

  @Nested(() => FrequencyAxisDto)
  frequency: FrequencyAxisDto;
}

export class QuietestMapResponseDto {
  @ApiProperty({ type: [Number], description: 'Ω' })
  resistances: number[];

  @ApiProperty({ type: [Number], description: 'Hz' })
  frequencies: number[];

  @ApiProperty({ type: [PartNameDto], description: 'The parts that win anywhere.' })
  parts: PartNameDto[];

  @ApiProperty({
    type: 'array',
    items: { type: 'array', items: { type: 'integer' } },
    description: 'For each resistance a row with, for each frequency, an index into parts; −1 = none.',
  })
  winners: number[][];

  @ApiProperty({ description: 'Changes whenever a part that could be ranked changes.' })
  libraryRevision: string;
}
