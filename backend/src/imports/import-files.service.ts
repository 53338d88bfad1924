import { mkdirSync } from 'node:fs';
import { readdir, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Injectable, Logger, type OnApplicationBootstrap } from '@nestjs/common';
import { AppConfig } from '../config/app-config.js';

const KEPT_MS = 30 * 24 * 3600_000;

/** The directory in which uploads stand until they are applied. */
@Injectable()
export class ImportFiles implements OnApplicationBootstrap {
  readonly directory: string;
  private readonly logger = new Logger(ImportFiles.name);

  constructor({ IMPORT_DIR }: AppConfig) {
    this.directory = IMPORT_DIR ?? join(tmpdir(), 'roothertz-imports');
  }

  /** Uploads that nobody applied in a month aren't kept. */
  async onApplicationBootstrap(): Promise<void> {
    this.ensureDirectory();
    for (const name of await readdir(this.directory)) {
      const found = await stat(this.pathOf(name)).catch(() => null);
      if (found !== null && Date.now() - found.mtimeMs > KEPT_MS) await this.remove(name);
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
