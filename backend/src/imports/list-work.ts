import type { Caller } from '../shared/access/caller.js';
import type { Import } from './entities/import.entity.js';

/** The long work on a kind of list, each begun by `start`. */
export interface ListWork {
  /** `done` resolves when the check has ended, however it did. */
  checking: { start(caller: Caller, entity: Import): Promise<{ done: Promise<void> }> };
  applying: { start(caller: Caller, entity: Import): Promise<void> };
  undoing: { start(caller: Caller, entity: Import): Promise<void> };
}
