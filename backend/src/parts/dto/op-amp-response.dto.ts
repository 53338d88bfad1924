import type { Amplifier, AmplifierOrigins } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { AmplifierOriginsDto, AmplifierResponseDto } from '../../shared/parts/amplifier.dto.js';
import { duplicateOf } from './duplicate-response.dto.js';
import { PartResponseDto } from './part-response.dto.js';

export class OpAmpResponseDto extends PartResponseDto {
  @ApiProperty({ type: AmplifierResponseDto })
  amplifier: Amplifier;

  @ApiProperty({ type: AmplifierOriginsDto })
  origins: AmplifierOrigins;
}

export class OpAmpListDto extends listOf(OpAmpResponseDto) {}

export class OpAmpDuplicateDto extends duplicateOf(OpAmpResponseDto) {}

export class OpAmpDuplicateListDto extends listOf(OpAmpDuplicateDto) {}
