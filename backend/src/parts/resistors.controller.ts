import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { VersionQueryDto } from '../shared/list/version-query.dto.js';
import { ChangeStandingsDto } from './dto/change-standings.dto.js';
import { CreateResistorDto } from './dto/create-resistor.dto.js';
import { ListDuplicatesDto } from './dto/list-duplicates.dto.js';
import {
  ChangeMatchingDto,
  MatchingChangedDto,
  StandingOutcomeDto,
  StandingsBackDto,
} from './dto/matching-standings.dto.js';
import { GapCountsDto } from './dto/gap-counts.dto.js';
import {
  ListResistorsDto,
  ResistorFilterDto,
  ResistorMatchDto,
  ResistorOutcomeDto,
} from './dto/list-resistors.dto.js';
import {
  ResistorDuplicateListDto,
  ResistorListDto,
  ResistorResponseDto,
} from './dto/resistor-response.dto.js';
import { UpdateResistorDto } from './dto/update-resistor.dto.js';
import { ResistorsService } from './resistors.service.js';

@ApiTags('resistors')
@Controller('resistors')
export class ResistorsController {
  constructor(private readonly resistors: ResistorsService) {}

  @Get()
  @Access('parts.read')
  @ApiOkResponse({ type: ResistorListDto })
  listResistors(
    @Caller() caller: CallerOfRequest,
    @Query() query: ListResistorsDto,
  ): Promise<ResistorListDto> {
    return this.resistors.list(caller, query);
  }

  @Post()
  @Access('parts.edit')
  @ApiCreatedResponse({ type: ResistorResponseDto })
  createResistor(
    @Caller() caller: CallerOfRequest,
    @Body() dto: CreateResistorDto,
  ): Promise<ResistorResponseDto> {
    return this.resistors.create(caller, dto);
  }

  @Patch()
  @Access('parts.edit')
  @ApiOkResponse({ type: ResistorListDto })
  changeResistorStandings(
    @Caller() caller: CallerOfRequest,
    @Body() { parts }: ChangeStandingsDto,
  ): Promise<ResistorListDto> {
    return this.resistors.changeStandings(caller, parts);
  }

  /** What would become of all resistors of a filter that are to stand otherwise. */
  @Get('standings')
  @Access('parts.edit')
  @ApiOkResponse({ type: StandingOutcomeDto })
  getResistorStandingOutcome(
    @Caller() caller: CallerOfRequest,
    @Query() query: ResistorOutcomeDto,
  ): Promise<StandingOutcomeDto> {
    return this.resistors.outcome(caller, query);
  }

  @Post('standings')
  @HttpCode(200)
  @Access('parts.edit')
  @ApiOkResponse({ type: MatchingChangedDto })
  changeMatchingResistors(
    @Caller() caller: CallerOfRequest,
    @Query() filter: ResistorMatchDto,
    @Body() dto: ChangeMatchingDto,
  ): Promise<MatchingChangedDto> {
    return this.resistors.change(caller, filter, dto);
  }

  /** Within a day; parts that were changed since stay as they are. */
  @Post('standings/:id/undo')
  @HttpCode(200)
  @Access('parts.edit')
  @ApiOkResponse({ type: StandingsBackDto })
  undoMatchingResistors(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
  ): Promise<StandingsBackDto> {
    return this.resistors.undoMatching(caller, id);
  }

  @Get('completeness')
  @Access('parts.read')
  @ApiOkResponse({ type: GapCountsDto })
  countResistorGaps(
    @Caller() caller: CallerOfRequest,
    @Query() filter: ResistorFilterDto,
  ): Promise<GapCountsDto> {
    return this.resistors.countGaps(caller, filter);
  }

  @Get('duplicates')
  @Access('parts.read')
  @ApiOkResponse({ type: ResistorDuplicateListDto })
  listResistorDuplicates(
    @Caller() caller: CallerOfRequest,
    @Query() page: ListDuplicatesDto,
  ): Promise<ResistorDuplicateListDto> {
    return this.resistors.listDuplicates(caller, page);
  }

  @Get(':id')
  @Access('parts.read')
  @ApiOkResponse({ type: ResistorResponseDto })
  getResistor(@Caller() caller: CallerOfRequest, @Param('id') id: string): Promise<ResistorResponseDto> {
    return this.resistors.find(caller, id);
  }

  @Patch(':id')
  @Access('parts.edit')
  @ApiOkResponse({ type: ResistorResponseDto })
  updateResistor(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Body() dto: UpdateResistorDto,
  ): Promise<ResistorResponseDto> {
    return this.resistors.update(caller, id, dto);
  }

  @Delete(':id')
  @HttpCode(204)
  @Access('parts.edit')
  @ApiNoContentResponse()
  deleteResistor(
    @Caller() caller: CallerOfRequest,
    @Param('id') id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.resistors.remove(caller, id, version);
  }
}
