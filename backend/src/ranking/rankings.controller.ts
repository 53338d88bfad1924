import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import type { Caller as CallerOfRequest } from '../shared/access/caller.js';
import { Caller } from '../shared/access/caller.decorator.js';
import { ExclusionListDto } from './dto/exclusions-response.dto.js';
import { QuietestMapDto, QuietestMapResponseDto } from './dto/quietest-map.dto.js';
import { RankOpAmpsDto } from './dto/rank-op-amps.dto.js';
import { RankStagesDto } from './dto/rank-stages.dto.js';
import { RankResistorsDto } from './dto/rank-resistors.dto.js';
import { RankingResponseDto } from './dto/ranking-response.dto.js';
import { StageRankingDto } from './dto/stage-ranking.dto.js';
import { ResistorExclusionListDto, ResistorRankingDto } from './dto/resistor-ranking.dto.js';
import { QuietestMapService } from './quietest-map.service.js';
import { RankingService } from './ranking.service.js';
import { ResistorRankingService } from './resistor-ranking.service.js';
import { StageRankingService } from './stage-ranking.service.js';

@ApiTags('rankings')
@Controller('rankings')
export class RankingsController {
  constructor(
    private readonly ranking: RankingService,
    private readonly map: QuietestMapService,
    private readonly resistors: ResistorRankingService,
    private readonly stages: StageRankingService,
  ) {}

  @Post('op-amps')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: RankingResponseDto })
  rankOpAmps(@Caller() caller: CallerOfRequest, @Body() dto: RankOpAmpsDto): Promise<RankingResponseDto> {
    return this.ranking.rank(caller, dto);
  }

  @Post('op-amps/exclusions')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: ExclusionListDto })
  listExclusions(@Caller() caller: CallerOfRequest, @Body() dto: RankOpAmpsDto): Promise<ExclusionListDto> {
    return this.ranking.exclusions(caller, dto);
  }

  @Post('quietest-map')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: QuietestMapResponseDto })
  drawQuietestMap(
    @Caller() caller: CallerOfRequest,
    @Body() dto: QuietestMapDto,
  ): Promise<QuietestMapResponseDto> {
    return this.map.draw(caller, dto);
  }

  @Post('resistors')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: ResistorRankingDto })
  rankResistors(
    @Caller() caller: CallerOfRequest,
    @Body() dto: RankResistorsDto,
  ): Promise<ResistorRankingDto> {
    return this.resistors.rank(caller, dto);
  }

  @Post('resistors/exclusions')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: ResistorExclusionListDto })
  listResistorExclusions(
    @Caller() caller: CallerOfRequest,
    @Body() dto: RankResistorsDto,
  ): Promise<ResistorExclusionListDto> {
    return this.resistors.exclusions(caller, dto);
  }

  @Post('stages')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: StageRankingDto })
  rankStages(@Caller() caller: CallerOfRequest, @Body() dto: RankStagesDto): Promise<StageRankingDto> {
    return this.stages.rank(caller, dto);
  }
}
