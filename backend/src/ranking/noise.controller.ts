import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access } from '../shared/access/access.decorator.js';
import { EvaluateStageDto } from './dto/evaluate-stage.dto.js';
import { StageFiguresDto } from './dto/stage-figures.dto.js';
import { RankingService } from './ranking.service.js';

@ApiTags('noise')
@Controller('noise')
export class NoiseController {
  constructor(private readonly ranking: RankingService) {}

  @Post('stage')
  @HttpCode(200)
  @Access('rankings.run')
  @ApiOkResponse({ type: StageFiguresDto })
  evaluateStageNoise(@Body() dto: EvaluateStageDto): StageFiguresDto {
    return this.ranking.stage(dto);
  }
}
