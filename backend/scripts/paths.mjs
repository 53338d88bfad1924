import { mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** What the scripts keep on this machine: never committed, readable by this user only. */
const LOCAL = join(ROOT, '.local');

export function inRoot(...path) {
  return join(ROOT, ...path);
}

export function inLocal(...path) {
  mkdirSync(LOCAL, { recursive: true, mode: 0o700 });
  return join(LOCAL, ...path);
}
