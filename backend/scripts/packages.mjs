import { existsSync, statSync } from 'node:fs';
import { inRoot } from './paths.mjs';
import { run } from './processes.mjs';
import { StepError, step, timed } from './steps.mjs';

/** npm writes this file last: an interrupted installation has none. */
const INSTALLED = inRoot('node_modules', '.package-lock.json');

export function refuseOldNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  throw new StepError(`Node ${version} is too old: Roothertz needs 20.19 or newer.`);
}

function isInstalled() {
  return (
    existsSync(INSTALLED) && statSync(INSTALLED).mtimeMs >= statSync(inRoot('package-lock.json')).mtimeMs
  );
}

/** Building needs the development packages, whatever NODE_ENV says. */
export function ensurePackages() {
  return step('Packages', async (note) => {
    if (isInstalled()) return 'present';
    note('npm ci');
    return timed(() => run('npm', ['ci', '--include=dev'], { cwd: inRoot() }));
  });
}
