import { Module } from '@nestjs/common';
import { LibraryModule } from '../library/library.module.js';
import { OpAmpsController } from './op-amps.controller.js';
import { OpAmpsService } from './op-amps.service.js';
import { ResistorsController } from './resistors.controller.js';
import { ResistorsService } from './resistors.service.js';

@Module({
  imports: [LibraryModule],
  controllers: [OpAmpsController, ResistorsController],
  providers: [OpAmpsService, ResistorsService],
})
export class PartsModule {}
