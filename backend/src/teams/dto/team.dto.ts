import { ApiProperty } from '@nestjs/swagger';
import { Id } from '../../shared/validation/id.decorator.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';
import { TEAM_NAME } from './team-name.js';

export class TeamResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;
}

export class RenameTeamDto {
  @StoredText(TEAM_NAME)
  name: string;
}

export class HandOverTeamDto {
  /** An admin of the team. */
  @Id()
  memberId: string;
}
