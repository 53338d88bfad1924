import { Injectable } from '@nestjs/common';
import { ApplyImport } from './apply/apply-import.service.js';
import { UndoImport } from './apply/undo-import.service.js';
import { CheckImport } from './check/check-import.service.js';
import type { ListWork } from './list-work.js';

/** The work on lists of parts. */
@Injectable()
export class PartLists implements ListWork {
  constructor(
    readonly checking: CheckImport,
    readonly applying: ApplyImport,
    readonly undoing: UndoImport,
  ) {}
}
