import { Module } from '@nestjs/common';
import { LibraryModule } from '../library/library.module.js';
import { LibraryIndex } from './library-index.service.js';
import { NoiseController } from './noise.controller.js';
import { QuietestMapService } from './quietest-map.service.js';
import { RankingService } from './ranking.service.js';
import { RankingsController } from './rankings.controller.js';
import { ResistorRankingService } from './resistor-ranking.service.js';
import { StageRankingService } from './stage-ranking.service.js';

@Module({
  imports: [LibraryModule],
  controllers: [RankingsController, NoiseController],
  providers: [RankingService, QuietestMapService, ResistorRankingService, StageRankingService, LibraryIndex],
})
export class RankingModule {}
