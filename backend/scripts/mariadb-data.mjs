import { mkdirSync, mkdtempSync, renameSync, rmSync, symlinkSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { findProgram } from './debian.mjs';
import { run } from './processes.mjs';

/** Made beside its place and moved there when whole, so that an interrupted making leaves nothing half done. */
export async function makeDataDirectory({ data, user }, note) {
  note('making the data directory');
  const half = `${data}.new`;
  rmSync(half, { recursive: true, force: true });
  mkdirSync(half, { mode: 0o700 });
  await throughLink(half, (link) =>
    run(findProgram('mariadb-install-db'), [
      '--no-defaults',
      `--datadir=${link}`,
      `--user=${user}`,
      '--auth-root-authentication-method=socket',
      '--skip-test-db',
    ]),
  );
  renameSync(half, data);
}

/** mariadb-install-db can't take a path with spaces: it is given a link without any. */
async function throughLink(directory, action) {
  const place = mkdtempSync(join(tmpdir(), 'roothertz-'));
  try {
    symlinkSync(directory, join(place, 'data'));
    await action(join(place, 'data'));
  } finally {
    rmSync(place, { recursive: true, force: true });
  }
}
