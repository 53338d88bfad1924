import { Body, Controller, Delete, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../../shared/access/caller.js';
import { Caller } from '../../shared/access/caller.decorator.js';
import { InvitationListDto, InvitationResponseDto, InviteMemberDto } from './dto/invitation.dto.js';
import { InvitationsService } from './invitations.service.js';

@ApiTags('team')
@Controller('team/invitations')
export class InvitationsController {
  constructor(private readonly invitations: InvitationsService) {}

  @Get()
  @Access('team.manage')
  @ApiOkResponse({ type: InvitationListDto })
  listInvitations(@Caller() caller: CallerOfRequest): Promise<InvitationListDto> {
    return this.invitations.list(caller);
  }

  @Post()
  @Access('team.manage')
  @ApiCreatedResponse({ type: InvitationResponseDto })
  inviteTeamMember(
    @Caller() caller: CallerOfRequest,
    @Body() dto: InviteMemberDto,
  ): Promise<InvitationResponseDto> {
    return this.invitations.invite(caller, dto);
  }

  @Post(':id/resend')
  @HttpCode(200)
  @Access('team.manage')
  @ApiOkResponse({ type: InvitationResponseDto })
  resendInvitation(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
  ): Promise<InvitationResponseDto> {
    return this.invitations.resend(caller, id);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('team.manage')
  @ApiNoContentResponse()
  revokeInvitation(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<void> {
    return this.invitations.revoke(caller, id);
  }
}
