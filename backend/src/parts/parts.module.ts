import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { ConditionsModule } from '../conditions/conditions.module.js';
import { LibraryModule } from '../library/library.module.js';
import { TeamsModule } from '../teams/teams.module.js';
import { DuplicatesController } from './duplicates.controller.js';
import { DuplicatesService } from './duplicates.service.js';
import { OpAmpsController } from './op-amps.controller.js';
import { OpAmpsService } from './op-amps.service.js';
import { PartUsesController } from './part-uses.controller.js';
import { PartUsesService } from './part-uses.service.js';
import { ResistorsController } from './resistors.controller.js';
import { ResistorsService } from './resistors.service.js';

@Module({
  imports: [AuditModule, ConditionsModule, LibraryModule, TeamsModule],
  controllers: [OpAmpsController, ResistorsController, PartUsesController, DuplicatesController],
  providers: [DuplicatesService, PartUsesService, OpAmpsService, ResistorsService],
})
export class PartsModule {}
