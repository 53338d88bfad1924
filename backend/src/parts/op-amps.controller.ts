import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { VersionQueryDto } from '../shared/list/version-query.dto.js';
import { ChangeStandingsDto } from './dto/change-standings.dto.js';
import { CreateOpAmpDto } from './dto/create-op-amp.dto.js';
import { ListDuplicatesDto } from './dto/list-duplicates.dto.js';
import {
  ChangeMatchingDto,
  MatchingChangedDto,
  StandingOutcomeDto,
  StandingsBackDto,
} from './dto/matching-standings.dto.js';
import { GapCountsDto } from './dto/gap-counts.dto.js';
import { ListOpAmpsDto, OpAmpFilterDto, OpAmpMatchDto, OpAmpOutcomeDto } from './dto/list-op-amps.dto.js';
import { OpAmpDuplicateListDto, OpAmpListDto, OpAmpResponseDto } from './dto/op-amp-response.dto.js';
import { UpdateOpAmpDto } from './dto/update-op-amp.dto.js';
import { OpAmpsService } from './op-amps.service.js';

@ApiTags('op-amps')
@Controller('op-amps')
export class OpAmpsController {
  constructor(private readonly opAmps: OpAmpsService) {}

  @Get()
  @Access('parts.read')
  @ApiOkResponse({ type: OpAmpListDto })
  listOpAmps(@Caller() caller: CallerOfRequest, @Query() query: ListOpAmpsDto): Promise<OpAmpListDto> {
    return this.opAmps.list(caller, query);
  }

  @Post()
  @Access('parts.edit')
  @ApiCreatedResponse({ type: OpAmpResponseDto })
  createOpAmp(@Caller() caller: CallerOfRequest, @Body() dto: CreateOpAmpDto): Promise<OpAmpResponseDto> {
    return this.opAmps.create(caller, dto);
  }

  @Patch()
  @Access('parts.edit')
  @ApiOkResponse({ type: OpAmpListDto })
  changeOpAmpStandings(
    @Caller() caller: CallerOfRequest,
    @Body() { parts }: ChangeStandingsDto,
  ): Promise<OpAmpListDto> {
    return this.opAmps.changeStandings(caller, parts);
  }

  /** What would become of all op-amps of a filter that are to stand otherwise. */
  @Get('standings')
  @Access('parts.edit')
  @ApiOkResponse({ type: StandingOutcomeDto })
  getOpAmpStandingOutcome(
    @Caller() caller: CallerOfRequest,
    @Query() query: OpAmpOutcomeDto,
  ): Promise<StandingOutcomeDto> {
    return this.opAmps.outcome(caller, query);
  }

  @Post('standings')
  @HttpCode(200)
  @Access('parts.edit')
  @ApiOkResponse({ type: MatchingChangedDto })
  changeMatchingOpAmps(
    @Caller() caller: CallerOfRequest,
    @Query() filter: OpAmpMatchDto,
    @Body() dto: ChangeMatchingDto,
  ): Promise<MatchingChangedDto> {
    return this.opAmps.change(caller, filter, dto);
  }

  /** Within a day; parts that were changed since stay as they are. */
  @Post('standings/:id/undo')
  @HttpCode(200)
  @Access('parts.edit')
  @ApiOkResponse({ type: StandingsBackDto })
  undoMatchingOpAmps(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<StandingsBackDto> {
    return this.opAmps.undoMatching(caller, id);
  }

  @Get('completeness')
  @Access('parts.read')
  @ApiOkResponse({ type: GapCountsDto })
  countOpAmpGaps(@Caller() caller: CallerOfRequest, @Query() filter: OpAmpFilterDto): Promise<GapCountsDto> {
    return this.opAmps.countGaps(caller, filter);
  }

  @Get('duplicates')
  @Access('parts.read')
  @ApiOkResponse({ type: OpAmpDuplicateListDto })
  listOpAmpDuplicates(
    @Caller() caller: CallerOfRequest,
    @Query() page: ListDuplicatesDto,
  ): Promise<OpAmpDuplicateListDto> {
    return this.opAmps.listDuplicates(caller, page);
  }

  @Get(':id')
  @Access('parts.read')
  @ApiOkResponse({ type: OpAmpResponseDto })
  getOpAmp(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<OpAmpResponseDto> {
    return this.opAmps.find(caller, id);
  }

  @Patch(':id')
  @Access('parts.edit')
  @ApiOkResponse({ type: OpAmpResponseDto })
  updateOpAmp(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Body() dto: UpdateOpAmpDto,
  ): Promise<OpAmpResponseDto> {
    return this.opAmps.update(caller, id, dto);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('parts.edit')
  @ApiNoContentResponse()
  deleteOpAmp(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.opAmps.remove(caller, id, version);
  }
}
