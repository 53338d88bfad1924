import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../../audit/audit.service.js';
import { type QuotedOffer, QuotedOffers } from '../../prices/quoted-offers.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { DomainError } from '../../shared/errors/domain-error.js';
import { portionsOf } from '../apply/accepted-rows.js';
import { changeAlone } from '../apply/change-alone.js';
import { Import } from '../entities/import.entity.js';
import { ImportPortion } from '../entities/import-portion.entity.js';
import { ImportFiles } from '../import-files.service.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { importRecord } from '../import-record.js';
import { APPLICABLE_STATES } from '../import-states.js';
import { acceptedRows } from '../row-counts.js';
import type { StoredRow } from '../stored-row.js';

type WrittenRow = StoredRow & { offer: QuotedOffer };

/** Writes the accepted offers of a price list: all of them or none. */
@Injectable()
export class ApplyPriceList {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly files: ImportFiles,
    private readonly jobs: ImportJobs,
    private readonly quoted: QuotedOffers,
    private readonly audit: AuditService,
  ) {}

  async start(caller: Caller, entity: Import): Promise<void> {
    if (entity.counts === null)
      throw new DomainError('import.state', 'The rows aren’t checked yet: say what the columns are.');
    const total = acceptedRows(entity.counts);
    await this.jobs.start(entity.id, { from: APPLICABLE_STATES, to: 'waiting', total }, (job) =>
      this.apply(job, caller, entity),
    );
  }

  private async apply(job: ImportJob, caller: Caller, entity: Import): Promise<void> {
    await changeAlone(job, `prices ${caller.teamId}`, 'applying', () =>
      this.quoted.change(caller, job.runner.manager, async (manager) => {
        await this.writeOffers(job, manager, caller);
        await manager.update(
          Import,
          { id: entity.id },
          { state: 'applied', appliedAt: new Date(), appliedById: caller.userId, storedName: null },
        );
        await this.audit.record(manager, caller, [importRecord('import.applied', entity)]);
      }),
    );
    if (entity.storedName !== null) await this.files.remove(entity.storedName);
  }

  private async writeOffers(job: ImportJob, manager: EntityManager, caller: Caller): Promise<void> {
    let done = 0;
    for await (const { importId, portion, rows } of portionsOf(this.dataSource, job.importId)) {
      const written = rows.filter((row): row is WrittenRow => row.offer !== undefined);
      if (written.length > 0) {
        await this.save(manager, caller, written);
        await manager.update(ImportPortion, { importId, portion }, { rows: rows as object[] });
      }
      done += rows.filter(({ state }) => state !== 'refused' && state !== 'unchanged').length;
      await job.progress(done);
    }
  }

  /** What the verdicts were given on must still be so: what has changed since is refused when it is saved. */
  private async save(manager: EntityManager, caller: Caller, rows: readonly WrittenRow[]): Promise<void> {
    const offers = rows.map(({ offer }) => offer);
    const ids = await this.quoted
      .save(manager, caller, offers, (index) => `line ${rows[index].line}, `)
      .catch(refuseOutdated);
    rows.forEach((row, index) => {
      row.writtenId = ids[index];
    });
  }
}

function refuseOutdated(error: unknown): never {
  if (!(error instanceof DomainError)) throw error;
  const [fault] = error.errors ?? [];
  const what = fault === undefined ? error.detail : `${fault.field}: ${fault.message}`;
  throw new DomainError(
    'import.outdated',
    `Something has changed since the check (${what}): check the rows again.`,
  );
}
