import type { Logger } from '@nestjs/common';
import { isDatabaseLoss } from './database-loss.js';

/** Logs why work of the background failed; not a lost database, which the health of the server tells. */
export function logFailure(logger: Logger, error: unknown): void {
  if (!isDatabaseLoss(error))
    logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
}
