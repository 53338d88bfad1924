import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { ConditionsModule } from '../conditions/conditions.module.js';
import { LibraryModule } from '../library/library.module.js';
import { PricesModule } from '../prices/prices.module.js';
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
import { PartLists } from './part-lists.service.js';
import { ApplyPriceList } from './prices/apply-price-list.service.js';
import { CheckPriceList } from './prices/check-price-list.service.js';
import { PriceLists } from './prices/price-lists.service.js';
import { UndoPriceList } from './prices/undo-price-list.service.js';
import { UploadsService } from './uploads.service.js';

@Module({
  imports: [AuditModule, ConditionsModule, LibraryModule, PricesModule],
  controllers: [ImportsController, PartExportsController],
  providers: [
    ApplyImport,
    ApplyPriceList,
    CheckImport,
    CheckPriceList,
    ImportFiles,
    ImportJobs,
    ImportRowsService,
    ImportsService,
    PartExports,
    PartLists,
    PriceLists,
    UndoImport,
    UndoPriceList,
    UploadsService,
  ],
})
export class ImportsModule {}
