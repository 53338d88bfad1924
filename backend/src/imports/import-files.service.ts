import { mkdirSync } from 'node:fs';
import { readdir, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Injectable, Logger, type OnApplicationBootstrap } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, In, IsNull, LessThan, Not } from 'typeorm';
import { AppConfig } from '../config/app-config.js';
import { Import } from './entities/import.entity.js';
import { MAPPABLE_STATES } from './import-states.js';

/** Uploads that nobody applied in so many days aren't kept. */
const KEPT_DAYS = 14;
const DAY_MS = 24 * 3600_000;

/** The directory in which uploads stand until they are applied. */
@Injectable()
export class ImportFiles implements OnApplicationBootstrap {
  readonly directory: string;
  private readonly logger = new Logger(ImportFiles.name);

  constructor(
    { IMPORT_DIR }: AppConfig,
    @InjectDataSource() private readonly dataSource: DataSource,
  ) {
    this.directory = IMPORT_DIR ?? join(tmpdir(), 'roothertz-imports');
  }

  onApplicationBootstrap(): Promise<void> {
    return this.forgetAbandoned().catch((error: unknown) => this.logger.warn(String(error)));
  }

  /** Removes the files of lists that nobody applied; what became of them stays in the history. */
  async forgetAbandoned(): Promise<void> {
    const before = new Date(Date.now() - KEPT_DAYS * DAY_MS);
    const abandoned = { storedName: Not(IsNull()), state: In(MAPPABLE_STATES), createdAt: LessThan(before) };
    const { manager } = this.dataSource;
    const found = await manager.find(Import, { select: { id: true }, where: abandoned });
    if (found.length > 0)
      await manager.update(
        Import,
        found.map(({ id }) => id),
        { storedName: null },
      );
    this.ensureDirectory();
    for (const name of await readdir(this.directory)) {
      const file = await stat(this.pathOf(name)).catch(() => null);
      if (file !== null && file.mtime < before) await this.remove(name);
    }
  }

  ensureDirectory(): void {
    mkdirSync(this.directory, { recursive: true, mode: 0o700 });
  }

  pathOf(name: string): string {
    return join(this.directory, name);
  }

  async exists(name: string): Promise<boolean> {
    return (await stat(this.pathOf(name)).catch(() => null)) !== null;
  }

  async remove(name: string): Promise<void> {
    await rm(this.pathOf(name), { force: true }).catch((error: unknown) => this.logger.warn(String(error)));
  }
}
