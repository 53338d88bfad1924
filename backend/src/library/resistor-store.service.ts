import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { ResistorPart } from '@roothertz/common/parts';
import { DataSource } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { LibraryService } from './library.service.js';
import { PartStore } from './part-store.js';
import { RESISTORS } from './part-tables.js';

@Injectable()
export class ResistorStore extends PartStore<ResistorPart> {
  constructor(@InjectDataSource() dataSource: DataSource, libraries: LibraryService, audit: AuditService) {
    super(RESISTORS, dataSource, libraries, audit);
  }
}
