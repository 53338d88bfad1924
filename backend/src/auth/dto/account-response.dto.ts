import { type Role, ROLES } from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';
import type { AccountToken } from '../entities/account-token.entity.js';
import type { Session } from '../entities/session.entity.js';
import { TOKEN_PURPOSES, type TokenPurpose } from '../token-purposes.js';
import { SessionTeamDto, type TeamName, toTeamName } from './session-response.dto.js';

export class LinkResponseDto {
  @ApiProperty({ enum: Object.keys(TOKEN_PURPOSES) })
  purpose: TokenPurpose;

  @ApiProperty({ description: 'The address to which the link was sent.' })
  email: string;
}

export class OpenSessionDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  team: SessionTeamDto;

  @ApiProperty({ type: String, format: 'date-time' })
  createdAt: string;

  @ApiProperty({ type: String, format: 'date-time' })
  lastSeenAt: string;

  @ApiProperty({ description: 'What the browser calls itself.' })
  userAgent: string;

  @ApiProperty({ description: 'The network address of the sign-in.' })
  address: string;

  @ApiProperty({ description: 'Whether the request came by this one.' })
  current: boolean;
}

export class OpenSessionListDto {
  @ApiProperty({ type: [OpenSessionDto] })
  items: OpenSessionDto[];
}

export class OwnTeamDto extends SessionTeamDto {
  @ApiProperty({ enum: ROLES, isArray: true })
  roles: Role[];
}

export class OwnTeamListDto {
  @ApiProperty({ type: [OwnTeamDto] })
  items: OwnTeamDto[];
}

export class DepartureDto {
  @ApiProperty()
  team: SessionTeamDto;

  @ApiProperty({ description: 'Nobody else is in the team: it is closed, and what it has kept.' })
  closes: boolean;

  @ApiProperty({ type: String, nullable: true, description: 'Why the account can’t be closed yet.' })
  obstacle: string | null;
}

export class DepartureListDto {
  @ApiProperty({ type: [DepartureDto] })
  items: DepartureDto[];
}

export function toLinkResponse({ purpose, email }: AccountToken): LinkResponseDto {
  return { purpose, email };
}

export function toOpenSession(session: Session, currentId: number): OpenSessionDto {
  const { id, team, createdAt, lastSeenAt, userAgent, address } = session;
  return {
    id: String(id),
    team: toTeamName(team),
    createdAt: createdAt.toISOString(),
    lastSeenAt: lastSeenAt.toISOString(),
    userAgent,
    address,
    current: id === currentId,
  };
}

export function toOwnTeam({ team, roles }: { team: TeamName; roles: Role[] }): OwnTeamDto {
  return { ...toTeamName(team), roles };
}

interface Departure extends Pick<DepartureDto, 'closes' | 'obstacle'> {
  team: TeamName;
}

export function toDeparture({ team, closes, obstacle }: Departure): DepartureDto {
  return { team: toTeamName(team), closes, obstacle };
}
