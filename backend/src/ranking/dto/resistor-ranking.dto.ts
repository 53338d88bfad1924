import {
  RESISTOR_CAUTIONS,
  type ResistorCaution,
  RESISTOR_EXCLUSION_REASONS,
  type ResistorExclusionReason,
  type ResistorFigures,
} from '@roothertz/common/noise';
import type { Resistor, ResistorOrigins } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { ResistorOriginsDto, ResistorParametersDto } from '../../shared/parts/resistor.dto.js';
import { PriceDto } from './price.dto.js';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';

export class RankedResistorPartDto extends PartNameDto {
  @ApiProperty({ type: ResistorParametersDto })
  resistor: Resistor;

  @ApiProperty({ type: ResistorOriginsDto })
  origins: ResistorOrigins;
}

export class RankedResistorDto implements ResistorFigures {
  @ApiProperty({ type: 'integer' })
  rank: number;

  @ApiProperty()
  part: RankedResistorPartDto;

  @ApiProperty({ description: 'In V over the band, at the resistor’s own temperature.' })
  thermalRms: number;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'In V over the band; null where the noise index is unknown.',
  })
  excessRms: number | null;

  @ApiProperty({ description: 'In V over the band; without the excess noise where that is unknown.' })
  totalRms: number;

  @ApiProperty({ description: 'The total above the thermal noise, in dB.' })
  aboveThermal: number;

  @ApiProperty({ description: 'In W.' })
  dissipation: number;

  @ApiProperty({ description: 'Of the resistor itself, in K.' })
  temperature: number;

  @ApiProperty({ enum: RESISTOR_CAUTIONS, isArray: true })
  cautions: ResistorCaution[];

  @ApiProperty({ type: PriceDto, nullable: true, description: 'null where the team has no price.' })
  unitPrice: PriceDto | null;
}

export class ResistorExclusionCountDto {
  @ApiProperty({ enum: RESISTOR_EXCLUSION_REASONS })
  reason: ResistorExclusionReason;

  @ApiProperty({ type: 'integer' })
  count: number;
}

export class ExcludedResistorsDto {
  @ApiProperty({ type: 'integer' })
  total: number;

  @ApiProperty({ type: [ResistorExclusionCountDto] })
  reasons: ResistorExclusionCountDto[];
}

export class ResistorRankingDto {
  @ApiProperty({ type: 'integer', description: 'How many resistors are ranked.' })
  total: number;

  @ApiProperty()
  excluded: ExcludedResistorsDto;

  @ApiProperty({ description: 'Changes whenever a part that could be ranked changes.' })
  libraryRevision: string;

  @ApiProperty({ type: [RankedResistorDto] })
  items: RankedResistorDto[];
}

export class ResistorExclusionDto {
  @ApiProperty()
  part: PartNameDto;

  @ApiProperty({ enum: RESISTOR_EXCLUSION_REASONS })
  reason: ResistorExclusionReason;

  @ApiProperty({ description: 'The reason in plain words, with its figures.' })
  detail: string;
}

export class ResistorExclusionListDto extends listOf(ResistorExclusionDto) {}
