import {
  type BeforeApplicationShutdown,
  Injectable,
  Logger,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager, In, IsNull, type QueryRunner } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { isDatabaseLoss } from '../shared/errors/database-loss.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { Import } from './entities/import.entity.js';
import { ImportProgress } from './entities/import-progress.entity.js';
import { ImportCancelled, ImportInterrupted } from './import-endings.js';
import { importRecord } from './import-record.js';
import { type ImportState, isRunning, RUNNING_STATES } from './import-states.js';

/** Work on an import while it runs. */
export interface ImportJob {
  importId: number;
  /** The connection that holds the job's lock: with it go the lock and an open transaction. */
  runner: QueryRunner;
  /** Notes how far the work is, and ends it where somebody cancelled it or the server stops. */
  progress(done: number): Promise<void>;
}

interface Beginning {
  from: readonly ImportState[];
  to: ImportState;
  /** How many rows the work goes through. */
  total: number;
}

const MOST_AT_ONCE = 3;
const NOTED_EVERY_MS = 200;
const LOCK = `CONCAT(LEFT(DATABASE(), 40), ' import ', ?)`;
/** What an import is again when its work ended without a result. */
const ENDED: Partial<Record<ImportState, ImportState>> = { checking: 'uploaded', undoing: 'applied' };

/**
 * Runs the long work on imports in this process. Each job holds a lock of the database by its own connection, so
 * that any server sees whether its owner lives; of a killed one, lock and transaction go with the connection.
 */
@Injectable()
export class ImportJobs implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(ImportJobs.name);
  private readonly running = new Map<number, Promise<void>>();
  private stopping = false;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly audit: AuditService,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    const abandoned = await this.dataSource
      .getRepository(Import)
      .findBy({ state: In(RUNNING_STATES) })
      .catch(() => []);
    for (const entity of abandoned) await this.settle(entity);
  }

  async beforeApplicationShutdown(): Promise<void> {
    this.stopping = true;
    await Promise.all(this.running.values());
  }

  /** Begins work on an import that is in one of the states; `done` resolves when it has ended, however it did. */
  async start(
    importId: number,
    beginning: Beginning,
    work: (job: ImportJob) => Promise<void>,
  ): Promise<{ done: Promise<void> }> {
    if (this.running.size >= MOST_AT_ONCE)
      throw new DomainError(
        'request.too-many',
        'Several imports are running already: try again in a moment.',
        {
          retryAfter: 10,
        },
      );
    if (this.running.has(importId)) throw notNow();
    const runner = this.dataSource.createQueryRunner();
    const begun = this.begin(importId, runner, beginning);
    const job = { importId, runner, progress: this.noter(importId) };
    const done = begun.then(() => this.run(job, work)).finally(() => this.running.delete(importId));
    this.running.set(
      importId,
      done.catch(() => undefined),
    );
    await begun;
    return { done };
  }

  /** Marks an import whose owner has ended without a word; answers whether it did. */
  async settle({ id, state }: Import): Promise<boolean> {
    if (!isRunning(state) || this.running.has(id)) return false;
    const [{ free }] = await this.dataSource.query(`SELECT IS_FREE_LOCK(${LOCK}) AS free`, [id]);
    if (!Number(free)) return false;
    const { affected } = await this.dataSource.manager.update(
      Import,
      { id, state },
      {
        state: ENDED[state] ?? 'interrupted',
        failure: 'The server ended meanwhile: the library is as before.',
      },
    );
    return affected === 1;
  }

  private async begin(importId: number, runner: QueryRunner, { from, to, total }: Beginning): Promise<void> {
    try {
      const [{ got }] = await runner.query(`SELECT GET_LOCK(${LOCK}, 0) AS got`, [importId]);
      const { affected } = Number(got)
        ? await this.dataSource.manager.update(
            Import,
            { id: importId, state: In(from) },
            { state: to, failure: null },
          )
        : { affected: 0 };
      if (affected !== 1) throw notNow();
      await this.dataSource.manager.update(
        ImportProgress,
        { importId },
        { done: 0, total, since: new Date(), cancelledById: null },
      );
    } catch (error) {
      await this.release(importId, runner);
      throw error;
    }
  }

  private async run(job: ImportJob, work: (job: ImportJob) => Promise<void>): Promise<void> {
    try {
      await work(job);
    } catch (error) {
      await this.end(job.importId, error).catch((failure: unknown) => this.logger.error(String(failure)));
    } finally {
      await this.release(job.importId, job.runner);
    }
  }

  private async end(id: number, error: unknown): Promise<void> {
    const { state } = await this.dataSource.manager.findOneByOrFail(Import, { id });
    const { state: ending, failure } = endingOf(error);
    if (ending === 'failed')
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    await this.dataSource.transaction(async (manager) => {
      await manager.update(Import, { id, state }, { state: ENDED[state] ?? ending, failure });
      if (ending === 'cancelled' && state !== 'checking') await this.recordCancelled(manager, id);
    });
  }

  private async recordCancelled(manager: EntityManager, id: number): Promise<void> {
    const entity = await manager.findOneOrFail(Import, { where: { id }, relations: { progress: true } });
    const { teamId, progress } = entity;
    const actor = { teamId, userId: progress.cancelledById };
    await this.audit.record(manager, actor, [importRecord('import.cancelled', entity)]);
  }

  private noter(importId: number): ImportJob['progress'] {
    let noted = 0;
    return async (done) => {
      if (this.stopping) throw new ImportInterrupted();
      if (Date.now() - noted < NOTED_EVERY_MS) return;
      noted = Date.now();
      const uncancelled = { importId, cancelledById: IsNull() };
      const { affected } = await this.dataSource.manager.update(ImportProgress, uncancelled, { done });
      if (affected === 0) throw new ImportCancelled();
    };
  }

  private async release(importId: number, runner: QueryRunner): Promise<void> {
    await runner.query(`SELECT RELEASE_LOCK(${LOCK})`, [importId]).catch(() => undefined);
    await runner.release().catch(() => undefined);
  }
}

function notNow(): DomainError {
  return new DomainError('import.state', 'The import isn’t in a state in which this can be done.');
}

function endingOf(error: unknown): { state: ImportState; failure: string | null } {
  if (error instanceof ImportCancelled) return { state: 'cancelled', failure: null };
  if (error instanceof ImportInterrupted || isDatabaseLoss(error))
    return { state: 'interrupted', failure: 'The work was cut off: the library is as before.' };
  if (error instanceof DomainError)
    return { state: error.code === 'import.outdated' ? 'outdated' : 'failed', failure: error.detail };
  return { state: 'failed', failure: 'Something went wrong on our side: the library is as before.' };
}
