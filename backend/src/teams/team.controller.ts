import { Body, Controller, Delete, Get, HttpCode, Patch, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { HandOverTeamDto, RenameTeamDto, TeamResponseDto } from './dto/team.dto.js';
import { MembersService } from './members.service.js';
import { TeamSettingsService } from './team-settings.service.js';

@ApiTags('team')
@Controller('team')
export class TeamController {
  constructor(
    private readonly settings: TeamSettingsService,
    private readonly members: MembersService,
  ) {}

  @Get()
  @Access('team.read')
  @ApiOkResponse({ type: TeamResponseDto })
  getTeam(@Caller() caller: CallerOfRequest): Promise<TeamResponseDto> {
    return this.settings.read(caller);
  }

  @Patch()
  @Access('team.manage')
  @ApiOkResponse({ type: TeamResponseDto })
  renameTeam(@Caller() caller: CallerOfRequest, @Body() { name }: RenameTeamDto): Promise<TeamResponseDto> {
    return this.settings.rename(caller, name);
  }

  @Post('owner')
  @HttpCode(204)
  @Access('team.manage')
  @ApiNoContentResponse()
  handOverTeam(@Caller() caller: CallerOfRequest, @Body() { memberId }: HandOverTeamDto): Promise<void> {
    return this.settings.handOver(caller, memberId);
  }

  @Delete('membership')
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse()
  leaveTeam(@Caller() caller: CallerOfRequest): Promise<void> {
    return this.members.leave(caller);
  }
}
