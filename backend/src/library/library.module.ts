import { Module } from '@nestjs/common';
import { LibraryService } from './library.service.js';
import { OpAmpStore } from './op-amp-store.service.js';

@Module({
  providers: [LibraryService, OpAmpStore],
  exports: [LibraryService, OpAmpStore],
})
export class LibraryModule {}
