const LOSS_CODES = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  'EHOSTUNREACH',
  'ENETUNREACH',
  'ENOTFOUND',
  'EAI_AGAIN',
  'ER_CON_COUNT_ERROR',
  'ER_CONNECTION_KILLED',
  'ER_NORMAL_SHUTDOWN',
  'ER_SERVER_SHUTDOWN',
  'PROTOCOL_CONNECTION_LOST',
  'PROTOCOL_SEQUENCE_TIMEOUT',
]);
const LOSS_MESSAGES = /queue limit reached|pool is closed|connection is in closed state|not initialized/i;

interface DriverError {
  code?: unknown;
  fatal?: unknown;
  message?: unknown;
  driverError?: unknown;
}

/** Whether an error means that the database can't be reached, and not that a query is wrong. */
export function isDatabaseLoss(error: unknown): boolean {
  if (typeof error !== 'object' || error === null) return false;
  const { code, fatal, message, driverError } = error as DriverError;
  if (driverError !== undefined && driverError !== error) return isDatabaseLoss(driverError);
  return fatal === true || LOSS_CODES.has(String(code)) || LOSS_MESSAGES.test(String(message));
}
