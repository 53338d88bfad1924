import {
  type Plan,
  type PlanState,
  PLANS,
  type Role,
  ROLES,
  type Standing,
  STANDINGS,
} from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';

class SessionUserDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  email: string;

  @ApiProperty()
  name: string;
}

export class SessionTeamDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;
}

export class SessionResponseDto {
  @ApiProperty()
  user: SessionUserDto;

  @ApiProperty()
  team: SessionTeamDto;

  @ApiProperty({ type: [SessionTeamDto], description: 'All teams that the person is in.' })
  teams: SessionTeamDto[];

  @ApiProperty({ enum: ROLES, isArray: true })
  roles: Role[];

  @ApiProperty({ enum: PLANS })
  plan: Plan;

  @ApiProperty({ enum: STANDINGS })
  standing: Standing;

  @ApiProperty({
    type: String,
    format: 'date-time',
    nullable: true,
    description: 'When the standing ends by itself, such as a trial; null = it doesn’t.',
  })
  standingUntil: string | null;
}

interface Session extends Pick<PlanState, 'plan' | 'standing' | 'until'> {
  account: { id: number; email: string; name: string };
  team: TeamName;
  roles: Role[];
}

export interface TeamName {
  id: number;
  name: string;
}

export function toSessionResponse(
  { account, team, roles, plan, standing, until }: Session,
  teams: readonly TeamName[],
): SessionResponseDto {
  const { id, email, name } = account;
  return {
    user: { id: String(id), email, name },
    team: toTeamName(team),
    teams: teams.map(toTeamName),
    roles,
    plan,
    standing,
    standingUntil: until?.toISOString() ?? null,
  };
}

export function toTeamName({ id, name }: TeamName): SessionTeamDto {
  return { id: String(id), name };
}
