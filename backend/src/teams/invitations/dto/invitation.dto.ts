import { type Role, ROLES } from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../../shared/list/list-response.js';
import { MemberDto, toMemberDto } from '../../../shared/members/member.dto.js';
import { Email } from '../../../shared/validation/email.decorator.js';
import { Options } from '../../../shared/validation/option.decorator.js';
import type { Invitation } from '../entities/invitation.entity.js';

export class InviteMemberDto {
  @Email()
  email: string;

  @Options(ROLES, { least: 1 })
  roles: Role[];
}

export class InvitationResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  email: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  roles: Role[];

  @ApiProperty({ type: MemberDto, nullable: true, description: 'null where the account is gone.' })
  invitedBy: MemberDto | null;

  @ApiProperty({ type: String, format: 'date-time' })
  sentAt: string;

  @ApiProperty({ type: String, format: 'date-time' })
  expiresAt: string;
}

export class InvitationListDto extends listOf(InvitationResponseDto) {}

export function toInvitationResponse(invitation: Invitation): InvitationResponseDto {
  const { id, email, roles, invitedBy, sentAt, expiresAt } = invitation;
  return {
    id: String(id),
    email,
    roles,
    invitedBy: toMemberDto(invitedBy),
    sentAt: sentAt.toISOString(),
    expiresAt: expiresAt.toISOString(),
  };
}
