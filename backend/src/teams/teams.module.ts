import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { PlansModule } from '../plans/plans.module.js';
import { Membership } from './entities/membership.entity.js';
import { SeatsService } from './seats.service.js';
import { TeamsService } from './teams.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Membership]), PlansModule],
  providers: [SeatsService, TeamsService],
  exports: [SeatsService, TeamsService],
})
export class TeamsModule {}
