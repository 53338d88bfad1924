import { type Plan, PLANS, type Role, ROLES } from '@roothertz/common/access';
import { ApiProperty } from '@nestjs/swagger';

class SessionUserDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  email: string;

  @ApiProperty()
  name: string;
}

class SessionTeamDto {
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

  @ApiProperty({ enum: ROLES, isArray: true })
  roles: Role[];

  @ApiProperty({ enum: PLANS })
  plan: Plan;
}

interface Session {
  account: { id: number; email: string; name: string };
  team: { id: number; name: string };
  roles: Role[];
  plan: Plan;
}

export function toSessionResponse({ account, team, roles, plan }: Session): SessionResponseDto {
  const { id, email, name } = account;
  return {
    user: { id: String(id), email, name },
    team: { id: String(team.id), name: team.name },
    roles,
    plan,
  };
}
