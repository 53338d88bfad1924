import { Body, Controller, Delete, Get, HttpCode, Param, Patch } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ChangeRolesDto, TeamMemberDto, TeamMemberListDto } from './dto/team-member.dto.js';
import { MembersService } from './members.service.js';

@ApiTags('team')
@Controller('team/members')
export class MembersController {
  constructor(private readonly members: MembersService) {}

  @Get()
  @Access('team.read')
  @ApiOkResponse({ type: TeamMemberListDto })
  listTeamMembers(@Caller() caller: CallerOfRequest): Promise<TeamMemberListDto> {
    return this.members.list(caller);
  }

  @Patch(':id')
  @Access('team.manage')
  @ApiOkResponse({ type: TeamMemberDto })
  changeTeamMemberRoles(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Body() { roles }: ChangeRolesDto,
  ): Promise<TeamMemberDto> {
    return this.members.changeRoles(caller, id, roles);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('team.manage')
  @ApiNoContentResponse()
  removeTeamMember(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<void> {
    return this.members.remove(caller, id);
  }
}
