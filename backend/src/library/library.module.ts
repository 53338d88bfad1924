import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { LibraryService } from './library.service.js';
import { OpAmpStore } from './op-amp-store.service.js';
import { ResistorStore } from './resistor-store.service.js';

@Module({
  imports: [AuditModule],
  providers: [LibraryService, OpAmpStore, ResistorStore],
  exports: [LibraryService, OpAmpStore, ResistorStore],
})
export class LibraryModule {}
