import { ApiProperty } from '@nestjs/swagger';
import { OperatingConditionsDto } from '../../shared/conditions/operating-conditions.dto.js';
import { PartFilterDto } from '../../shared/conditions/part-filter.dto.js';
import { RankingTargetDto } from '../../shared/conditions/ranking-request.dto.js';
import { listOf } from '../../shared/list/list-response.js';
import { MemberDto, toMemberDto } from '../../shared/members/member.dto.js';
import type { SavedConditions } from '../entities/saved-conditions.entity.js';

export class ConditionsResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;

  @ApiProperty()
  conditions: OperatingConditionsDto;

  @ApiProperty()
  filter: PartFilterDto;

  @ApiProperty()
  target: RankingTargetDto;

  @ApiProperty({ type: 'integer' })
  quantity: number;

  @ApiProperty({ type: [String], description: 'The parts that were chosen at these conditions.' })
  partIds: string[];

  @ApiProperty({ type: 'integer' })
  version: number;

  @ApiProperty({ type: String, format: 'date-time' })
  updatedAt: string;

  @ApiProperty({ type: MemberDto, nullable: true })
  updatedBy: MemberDto | null;
}

export class ConditionsListDto extends listOf(ConditionsResponseDto) {}

export function toConditionsResponse(saved: SavedConditions): ConditionsResponseDto {
  const { id, name, conditions, filter, target, quantity, parts, version, updatedAt, updatedBy } = saved;
  return {
    id: String(id),
    name,
    conditions,
    filter,
    target,
    quantity,
    partIds: parts.map(({ partId }) => String(partId)),
    version,
    updatedAt: updatedAt.toISOString(),
    updatedBy: toMemberDto(updatedBy),
  };
}
