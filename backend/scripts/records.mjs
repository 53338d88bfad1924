import { mkdirSync, readFileSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { commandLine, workingDirectory } from './processes.mjs';
import { ROOT, inLocal } from './paths.mjs';

/**
 * Which processes this checkout has started, kept on disk: a script that was killed leaves them behind, and the
 * next one must find them.
 */
export function remember(name, record) {
  mkdirSync(inLocal('running'), { recursive: true });
  writePrivately(inLocal('running', `${name}.json`), { ...record, owner: process.pid });
}

export function forget(name) {
  rmSync(inLocal('running', `${name}.json`), { force: true });
}

export function recall(name) {
  return readJson(inLocal('running', `${name}.json`));
}

export function recallAll() {
  mkdirSync(inLocal('running'), { recursive: true });
  return readdirSync(inLocal('running'))
    .filter((file) => file.endsWith('.json'))
    .map((file) => file.slice(0, -'.json'.length))
    .map((name) => ({ name, ...recall(name) }));
}

/** Process numbers are used again, so a number alone proves nothing: the owner must be a script of this checkout. */
export function ownerIsAlive({ owner } = {}) {
  if (!owner || owner === process.pid) return false;
  const command = commandLine(owner);
  return (
    /\b(start|test|bench)\.mjs\b/.test(command) && `${workingDirectory(owner)} ${command}`.includes(ROOT)
  );
}

export function writePrivately(path, value) {
  writeFileSync(`${path}.new`, JSON.stringify(value, null, 2), { mode: 0o600 });
  renameSync(`${path}.new`, path);
}

export function readJson(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch (error) {
    if (error.code === 'ENOENT' || error instanceof SyntaxError) return undefined;
    throw error;
  }
}
