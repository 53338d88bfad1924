import { ApiProperty } from '@nestjs/swagger';
import {
  type Amplifier,
  type AmplifierOrigins,
  type Approval,
  APPROVALS,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import type { OpAmpRecord } from '../../library/op-amp-record.js';
import { listOf } from '../../shared/list/list-response.js';
import { AmplifierResponseDto } from '../../shared/op-amps/amplifier.dto.js';
import { OriginsDto } from '../../shared/op-amps/origins.dto.js';

export class OpAmpResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: LIBRARIES })
  library: Library;

  @ApiProperty()
  manufacturer: string;

  @ApiProperty()
  partNumber: string;

  @ApiProperty()
  description: string;

  @ApiProperty()
  package: string;

  @ApiProperty({ enum: LIFECYCLES })
  lifecycle: Lifecycle;

  @ApiProperty({ enum: APPROVALS })
  approval: Approval;

  @ApiProperty({ type: AmplifierResponseDto })
  amplifier: Amplifier;

  @ApiProperty({ type: OriginsDto })
  origins: AmplifierOrigins;

  @ApiProperty({ type: 'integer' })
  version: number;

  @ApiProperty({ type: String, format: 'date-time' })
  updatedAt: string;
}

export class OpAmpListDto extends listOf(OpAmpResponseDto) {}

export function toOpAmpResponse(record: OpAmpRecord): OpAmpResponseDto {
  return { ...record, id: String(record.id), updatedAt: record.updatedAt.toISOString() };
}
