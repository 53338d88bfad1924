import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { OpAmpPart } from '@roothertz/common/parts';
import { DataSource } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { LibraryService } from './library.service.js';
import { PartStore } from './part-store.js';
import { OP_AMPS } from './part-tables.js';

@Injectable()
export class OpAmpStore extends PartStore<OpAmpPart> {
  constructor(@InjectDataSource() dataSource: DataSource, libraries: LibraryService, audit: AuditService) {
    super(OP_AMPS, dataSource, libraries, audit);
  }
}
