import { AUDIT_ACTIONS, AUDIT_OBJECTS, type AuditAction, type AuditObject } from '@roothertz/common/audit';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { MemberDto, toMemberDto } from '../../shared/members/member.dto.js';
import type { AuditEntry } from '../entities/audit-entry.entity.js';

export class AuditObjectDto {
  @ApiProperty({ enum: Object.keys(AUDIT_OBJECTS) })
  kind: AuditObject;

  @ApiProperty()
  id: string;

  @ApiProperty({ type: String, nullable: true, description: 'What it was called then.' })
  label: string | null;
}

export class AuditEntryResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ type: String, format: 'date-time' })
  at: string;

  @ApiProperty({ type: MemberDto, nullable: true, description: 'null where the account is gone.' })
  by: MemberDto | null;

  @ApiProperty({ enum: Object.keys(AUDIT_ACTIONS) })
  action: AuditAction;

  @ApiProperty()
  object: AuditObjectDto;

  @ApiProperty({ type: Object, nullable: true, description: 'What stood before; null = nothing.' })
  from: object | null;

  @ApiProperty({ type: Object, nullable: true, description: 'What stands since; null = nothing.' })
  to: object | null;
}

export class AuditListDto extends listOf(AuditEntryResponseDto) {}

export function toAuditEntryResponse(entry: AuditEntry): AuditEntryResponseDto {
  const { id, at, user, action, objectKind, objectId, objectLabel, from, to } = entry;
  return {
    id: String(id),
    at: at.toISOString(),
    by: toMemberDto(user),
    action,
    object: { kind: objectKind, id: objectId, label: objectLabel },
    from,
    to,
  };
}
