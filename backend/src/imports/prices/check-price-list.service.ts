import { NOT_STATED, type PriceRowReader, priceRowReader } from '@roothertz/common/imports';
import { dayOf } from '@roothertz/common/prices';
import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { ConditionsService } from '../../conditions/conditions.service.js';
import { QuotedOffers } from '../../prices/quoted-offers.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { writeRows } from '../check/row-writer.js';
import { Import } from '../entities/import.entity.js';
import { ImportPortion } from '../entities/import-portion.entity.js';
import { readRows } from '../file/csv-records.js';
import { ImportFiles } from '../import-files.service.js';
import { type ImportJob, ImportJobs } from '../import-jobs.service.js';
import { MAPPABLE_STATES } from '../import-states.js';
import { noRows } from '../row-counts.js';
import type { StoredRow } from '../stored-row.js';
import { offerGroups, type ReadLine } from './offer-groups.js';
import { knownOffers, placeOf } from './offer-places.js';
import { PriceVerdicts } from './price-verdicts.js';

/** Rows that are stored together, and offers that are looked up together. */
const PORTION = 500;

/** Gives every row of a price list its verdict, all in one transaction. */
@Injectable()
export class CheckPriceList {
  constructor(
    private readonly files: ImportFiles,
    private readonly jobs: ImportJobs,
    private readonly quoted: QuotedOffers,
    private readonly conditions: ConditionsService,
  ) {}

  start(caller: Caller, { id, rowCount }: Import): Promise<{ done: Promise<void> }> {
    const beginning = { from: MAPPABLE_STATES, to: 'checking' as const, total: rowCount };
    return this.jobs.start(id, beginning, (job) => this.check(job, caller));
  }

  private async check(job: ImportJob, caller: Caller): Promise<void> {
    const { runner, importId } = job;
    const entity = await runner.manager.findOneByOrFail(Import, { id: importId });
    const { mapping, dialect, wholeList } = entity;
    const reader = priceRowReader(mapping ?? [], dialect.decimalMark, wholeList ?? NOT_STATED);
    const portions = await this.readPortions(job, entity, reader);
    await runner.manager.transaction(async (manager) => {
      const rows = await this.judge(job, manager, caller, reader, portions.flat());
      const counts = noRows();
      await manager.delete(ImportPortion, { importId });
      for (const [index, lines] of portions.entries()) {
        const stored = lines.map((line) => rows.get(line)!);
        await writeRows(runner, { importId, portion: index + 1 }, stored, counts);
      }
      await manager.update(Import, { id: importId }, { state: 'checked', counts, rowCount: rows.size });
    });
  }

  private async readPortions(
    job: ImportJob,
    { storedName, dialect }: Import,
    reader: PriceRowReader,
  ): Promise<ReadLine[][]> {
    const portions: ReadLine[][] = [];
    for await (const records of readRows(this.files.pathOf(storedName!), dialect, PORTION)) {
      portions.push(records.map(({ line, cells }) => ({ line, cells, row: reader.read(cells) })));
      await job.progress(0);
    }
    return portions;
  }

  private async judge(
    job: ImportJob,
    manager: EntityManager,
    caller: Caller,
    reader: PriceRowReader,
    lines: readonly ReadLine[],
  ): Promise<Map<ReadLine, StoredRow>> {
    const uses = await this.conditions.partsInUse(caller, manager);
    const verdicts = new PriceVerdicts(reader, dayOf(new Date()), uses);
    const { groups, apart } = offerGroups(reader, lines);
    const suppliers = await this.quoted.supplierIds(manager, caller);
    const rows = new Map(apart.map((line): [ReadLine, StoredRow] => [line, verdicts.apart(line)]));
    for (let start = 0; start < groups.length; start += PORTION) {
      const some = groups.slice(start, start + PORTION);
      const known = await knownOffers(manager, caller, this.quoted, suppliers, some);
      for (const group of some)
        for (const [line, row] of verdicts.of(group, placeOf(group, known))) rows.set(line, row);
      await job.progress(rows.size);
    }
    return rows;
  }
}
