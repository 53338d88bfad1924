import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { TeamsModule } from '../teams/teams.module.js';
import { ConditionsController } from './conditions.controller.js';
import { ConditionsService } from './conditions.service.js';

@Module({
  imports: [AuditModule, TeamsModule],
  controllers: [ConditionsController],
  providers: [ConditionsService],
  exports: [ConditionsService],
})
export class ConditionsModule {}
