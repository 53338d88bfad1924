import { createHash } from 'node:crypto';
import { lstatSync, mkdirSync } from 'node:fs';
import { tmpdir, userInfo } from 'node:os';
import { join } from 'node:path';
import { inLocal } from './paths.mjs';
import { StepError } from './steps.mjs';

/** The kernel takes no longer path for a socket. */
const LONGEST_SOCKET_PATH = 107;

/** Where a server of ours keeps its data, socket and log. */
export function serverPlace(name) {
  return {
    name,
    data: inLocal(name),
    log: inLocal(`${name}.log`),
    pidFile: inLocal(name, 'roothertz.pid'),
    socket: socketPath(inLocal(`${name}.sock`)),
    user: userInfo().username,
  };
}

function socketPath(preferred) {
  if (Buffer.byteLength(preferred) <= LONGEST_SOCKET_PATH) return preferred;
  const hash = createHash('sha256').update(preferred).digest('hex').slice(0, 12);
  const directory = join(tmpdir(), `roothertz-${hash}`);
  mkdirSync(directory, { recursive: true, mode: 0o700 });
  const { uid } = lstatSync(directory);
  if (uid !== process.getuid()) throw new StepError(`${directory} belongs to another user.`);
  return join(directory, 's');
}
