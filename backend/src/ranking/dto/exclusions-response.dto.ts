import { EXCLUSION_REASONS, type ExclusionReason } from '@roothertz/common/noise';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';

export class ExclusionDto {
  @ApiProperty()
  part: PartNameDto;

  @ApiProperty({ enum: EXCLUSION_REASONS })
  reason: ExclusionReason;

  @ApiProperty({ description: 'The reason in plain words, with its figures.' })
  detail: string;
}

export class ExclusionListDto extends listOf(ExclusionDto) {}
