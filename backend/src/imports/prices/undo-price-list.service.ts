import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../../audit/audit.service.js';
import { QuotedOffers } from '../../prices/quoted-offers.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { portionsOf } from '../apply/accepted-rows.js';
import { changeAlone } from '../apply/change-alone.js';
import { markKept } from '../apply/mark-kept.js';
import { Import } from '../entities/import.entity.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { importRecord } from '../import-record.js';
import { acceptedRows } from '../row-counts.js';
import type { StoredRow } from '../stored-row.js';

/** Brings back the offers that stood before a price list; those that were changed or confirmed since stay. */
@Injectable()
export class UndoPriceList {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly jobs: ImportJobs,
    private readonly quoted: QuotedOffers,
    private readonly audit: AuditService,
  ) {}

  async start(caller: Caller, entity: Import): Promise<void> {
    const total = entity.counts === null ? 0 : acceptedRows(entity.counts);
    await this.jobs.start(entity.id, { from: ['applied'], to: 'undoing', total }, (job) =>
      changeAlone(job, `prices ${caller.teamId}`, 'undoing', () =>
        this.quoted.change(caller, job.runner.manager, (manager) => this.undo(job, manager, caller, entity)),
      ),
    );
  }

  private async undo(job: ImportJob, manager: EntityManager, caller: Caller, entity: Import): Promise<void> {
    let [done, kept] = [0, 0];
    for await (const portion of portionsOf(this.dataSource, entity.id)) {
      const written = portion.rows.filter(({ writtenId }) => writtenId !== undefined);
      const stay = await this.quoted.takeBack(manager, caller, written.map(toWritten));
      kept += await markKept(
        job.runner,
        portion,
        written.filter(({ writtenId }) => stay.has(writtenId!)),
      );
      done += written.length;
      await job.progress(done);
    }
    const undone = { undoneAt: new Date(), undoneById: caller.userId, keptCount: kept };
    await manager.update(Import, { id: entity.id }, { state: 'undone', ...undone });
    await this.audit.record(manager, caller, [
      importRecord('import.undone', entity, { takenBack: done - kept, kept }),
    ]);
  }
}

function toWritten({ writtenId, offer }: StoredRow) {
  return { id: writtenId!, before: offer?.id === undefined ? null : Number(offer.id) };
}
