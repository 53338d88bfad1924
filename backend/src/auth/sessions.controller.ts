import { Body, Controller, Delete, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { TeamsService } from '../teams/teams.service.js';
import { AuthService } from './auth.service.js';
import { OpenSessionListDto, OwnTeamListDto, toOpenSession, toOwnTeam } from './dto/account-response.dto.js';
import { SwitchTeamDto } from './dto/account.dto.js';
import { SessionResponseDto } from './dto/session-response.dto.js';
import type { SessionCaller } from './session-caller.js';
import { SessionsService } from './sessions.service.js';

@ApiTags('session')
@Controller('auth')
export class SessionsController {
  constructor(
    private readonly sessions: SessionsService,
    private readonly teams: TeamsService,
    private readonly auth: AuthService,
  ) {}

  @Get('sessions')
  @Access('session.own')
  @ApiOkResponse({ type: OpenSessionListDto })
  async listSessions(@Caller() caller: SessionCaller): Promise<OpenSessionListDto> {
    const sessions = await this.sessions.list(caller);
    return { items: sessions.map((session) => toOpenSession(session, caller.sessionId)) };
  }

  @Delete('sessions/:id')
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse()
  endSession(@Caller() caller: SessionCaller, @Param('id') id: string): Promise<void> {
    return this.sessions.end(caller, id);
  }

  @Delete('sessions')
  @HttpCode(204)
  @Access('session.own')
  @ApiNoContentResponse()
  endOtherSessions(@Caller() caller: SessionCaller): Promise<void> {
    return this.sessions.endOthersOf(caller);
  }

  @Get('teams')
  @Access('session.own')
  @ApiOkResponse({ type: OwnTeamListDto })
  async listOwnTeams(@Caller() { userId }: SessionCaller): Promise<OwnTeamListDto> {
    return { items: (await this.teams.teamsOf(userId)).map(toOwnTeam) };
  }

  @Post('team')
  @HttpCode(200)
  @Access('session.own')
  @ApiOkResponse({ type: SessionResponseDto })
  async switchTeam(
    @Caller() caller: SessionCaller,
    @Body() { teamId }: SwitchTeamDto,
  ): Promise<SessionResponseDto> {
    return this.auth.describe(await this.sessions.switchTeam(caller, teamId));
  }
}
