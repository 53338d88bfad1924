import { type Role, ROLES } from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { Options } from '../../shared/validation/option.decorator.js';
import type { Membership } from '../entities/membership.entity.js';

export class TeamMemberDto {
  /** The id of the person’s account. */
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;

  @ApiProperty()
  email: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  roles: Role[];

  @ApiProperty({ description: 'The admin who holds the team’s plan.' })
  isOwner: boolean;

  @ApiProperty({ type: String, format: 'date-time' })
  joinedAt: string;
}

export class TeamMemberListDto extends listOf(TeamMemberDto) {}

export class ChangeRolesDto {
  @Options(ROLES, { least: 1 })
  roles: Role[];
}

export function toTeamMember({ user, roles, joinedAt }: Membership, ownerId: number | null): TeamMemberDto {
  const { id, name, email } = user;
  return {
    id: String(id),
    name,
    email,
    roles,
    isOwner: id === ownerId,
    joinedAt: joinedAt.toISOString(),
  };
}
