import { Module } from '@nestjs/common';
import { TeamsModule } from '../teams/teams.module.js';
import { ConditionsController } from './conditions.controller.js';
import { ConditionsService } from './conditions.service.js';

@Module({
  imports: [TeamsModule],
  controllers: [ConditionsController],
  providers: [ConditionsService],
})
export class ConditionsModule {}
