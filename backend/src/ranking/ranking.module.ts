import { Module } from '@nestjs/common';
import { LibraryModule } from '../library/library.module.js';
import { PricesModule } from '../prices/prices.module.js';
import { LibraryIndex } from './library-index.service.js';
import { NoiseController } from './noise.controller.js';
import { PriceIndex } from './price-index.service.js';
import { QuietestMapService } from './quietest-map.service.js';
import { RankingService } from './ranking.service.js';
import { RankingsController } from './rankings.controller.js';
import { ResistorRankingService } from './resistor-ranking.service.js';
import { StageRankingService } from './stage-ranking.service.js';

@Module({
  imports: [LibraryModule, PricesModule],
  controllers: [RankingsController, NoiseController],
  providers: [
    RankingService,
    QuietestMapService,
    ResistorRankingService,
    StageRankingService,
    LibraryIndex,
    PriceIndex,
  ],
})
export class RankingModule {}
