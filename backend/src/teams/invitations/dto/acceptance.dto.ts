import { type Role, ROLES } from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';
import { StoredText } from '../../../shared/validation/stored-text.decorator.js';
import { Text } from '../../../shared/validation/text.decorator.js';
import { TeamResponseDto } from '../../dto/team.dto.js';
import type { Invitation } from '../entities/invitation.entity.js';

/** What the holder of an invitation's link is told. */
export class OpenInvitationDto {
  @ApiProperty()
  team: TeamResponseDto;

  @ApiProperty({ description: 'The address that is invited.' })
  email: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  roles: Role[];

  @ApiProperty({ type: String, nullable: true })
  invitedBy: string | null;

  @ApiProperty({ type: String, format: 'date-time' })
  expiresAt: string;

  @ApiProperty({ description: 'The address has an account, which accepts by signing in.' })
  hasAccount: boolean;
}

const PERSON_NAME = {
  key: 'name',
  label: 'name',
  required: true,
  maxLength: 120,
  fallback: null,
  synonyms: [],
} as const;

/** A new account by which an invitation is accepted: the link has shown that the address is the person's own. */
export class JoinTeamDto {
  @StoredText(PERSON_NAME)
  name: string;

  @Text({ label: 'password', minLength: 1, maxLength: 200 })
  password: string;
}

export function toOpenInvitation(invitation: Invitation, hasAccount: boolean): OpenInvitationDto {
  const { team, email, roles, invitedBy, expiresAt } = invitation;
  return {
    team: { id: String(team.id), name: team.name },
    email,
    roles,
    invitedBy: invitedBy?.name ?? null,
    expiresAt: expiresAt.toISOString(),
    hasAccount,
  };
}
