import { Module } from '@nestjs/common';
import { LibraryModule } from '../library/library.module.js';
import { OpAmpsController } from './op-amps.controller.js';
import { OpAmpsService } from './op-amps.service.js';

@Module({
  imports: [LibraryModule],
  controllers: [OpAmpsController],
  providers: [OpAmpsService],
})
export class PartsModule {}
