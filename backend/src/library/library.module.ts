import { Module } from '@nestjs/common';
import { LibraryService } from './library.service.js';
import { OpAmpStore } from './op-amp-store.service.js';
import { ResistorStore } from './resistor-store.service.js';

@Module({
  providers: [LibraryService, OpAmpStore, ResistorStore],
  exports: [LibraryService, OpAmpStore, ResistorStore],
})
export class LibraryModule {}
