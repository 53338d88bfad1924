import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../../shared/access/caller.js';
import { Caller } from '../../shared/access/caller.decorator.js';
import { Public } from '../../shared/access/public.decorator.js';
import { TeamResponseDto } from '../dto/team.dto.js';
import { AcceptanceService } from './acceptance.service.js';
import { JoinTeamDto, OpenInvitationDto } from './dto/acceptance.dto.js';

@ApiTags('team')
@Controller('invitations')
export class AcceptanceController {
  constructor(private readonly acceptance: AcceptanceService) {}

  @Public()
  @Get(':token')
  @ApiOkResponse({ type: OpenInvitationDto })
  getInvitation(@Param('token') token: string): Promise<OpenInvitationDto> {
    return this.acceptance.read(token);
  }

  @Post(':token/accept')
  @HttpCode(200)
  @Access('session.own')
  @ApiOkResponse({ type: TeamResponseDto })
  acceptInvitation(
    @Caller() caller: CallerOfRequest,
    @Param('token') token: string,
  ): Promise<TeamResponseDto> {
    return this.acceptance.accept(caller, token);
  }

  @Public()
  @Post(':token/account')
  @ApiCreatedResponse({ type: TeamResponseDto })
  joinWithNewAccount(@Param('token') token: string, @Body() dto: JoinTeamDto): Promise<TeamResponseDto> {
    return this.acceptance.signUp(token, dto);
  }
}
