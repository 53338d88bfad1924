import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { LibraryModule } from '../library/library.module.js';
import { ApplyImport } from './apply/apply-import.service.js';
import { UndoImport } from './apply/undo-import.service.js';
import { CheckImport } from './check/check-import.service.js';
import { ImportFiles } from './import-files.service.js';
import { ImportJobs } from './import-jobs.service.js';
import { ImportRowsService } from './import-rows.service.js';
import { ImportsController } from './imports.controller.js';
import { ImportsService } from './imports.service.js';
import { PartExportsController } from './part-exports.controller.js';
import { PartExports } from './part-exports.service.js';
import { UploadsService } from './uploads.service.js';

@Module({
  imports: [AuditModule, LibraryModule],
  controllers: [ImportsController, PartExportsController],
  providers: [
    ApplyImport,
    CheckImport,
    ImportFiles,
    ImportJobs,
    ImportRowsService,
    ImportsService,
    PartExports,
    UndoImport,
    UploadsService,
  ],
})
export class ImportsModule {}
