import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';

const isTest = (name) => /\.(test|spec|e2e-spec)\.tsx?$/.test(name);

/** The newest change under a file or directory; a removed file shows in its directory's own time. */
function newestChange(path) {
  if (!existsSync(path)) return 0;
  const stats = statSync(path);
  if (!stats.isDirectory()) return stats.mtimeMs;
  return readdirSync(path)
    .filter((name) => !isTest(name))
    .reduce((newest, name) => Math.max(newest, newestChange(join(path, name))), stats.mtimeMs);
}

/** Whether anything among `sources` changed after `stamp` was set, or the output is not there at all. */
export function isStale({ stamp, output, sources }) {
  if (!existsSync(stamp) || !existsSync(output)) return true;
  const built = statSync(stamp).mtimeMs;
  return sources.some((source) => newestChange(source) > built);
}

/** Files that the latest build did not write again: what was made of sources that are gone. */
export function leftovers(directory, since) {
  return readdirSync(directory, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath ?? entry.path, entry.name))
    .filter((path) => statSync(path).mtimeMs < since);
}
