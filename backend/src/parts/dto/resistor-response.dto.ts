import type { Resistor, ResistorOrigins } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { ResistorOriginsDto, ResistorParametersDto } from '../../shared/parts/resistor.dto.js';
import { duplicateOf } from './duplicate-response.dto.js';
import { PartResponseDto } from './part-response.dto.js';

export class ResistorResponseDto extends PartResponseDto {
  @ApiProperty({ type: ResistorParametersDto })
  resistor: Resistor;

  @ApiProperty({ type: ResistorOriginsDto })
  origins: ResistorOrigins;
}

export class ResistorListDto extends listOf(ResistorResponseDto) {}

export class ResistorDuplicateDto extends duplicateOf(ResistorResponseDto) {}

export class ResistorDuplicateListDto extends listOf(ResistorDuplicateDto) {}
