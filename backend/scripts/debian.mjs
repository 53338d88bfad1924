import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { run } from './processes.mjs';
import { StepError } from './steps.mjs';

const SYSTEM_DIRECTORIES = ['/usr/sbin', '/usr/bin', '/usr/local/sbin', '/usr/local/bin', '/sbin', '/bin'];

/** An executable's path; system directories count even when an ordinary user's PATH leaves them out. */
export function findProgram(...names) {
  const directories = [...(process.env.PATH ?? '').split(delimiter).filter(Boolean), ...SYSTEM_DIRECTORIES];
  const paths = names.flatMap((name) => directories.map((directory) => join(directory, name)));
  return paths.find(isExecutable);
}

function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Packages' services stay off meanwhile: policy-rc.d is Debian's own way to say so. */
const INSTALL = `
set -e
export DEBIAN_FRONTEND=noninteractive
policy=/usr/sbin/policy-rc.d
if [ ! -e "$policy" ]; then
  trap 'rm -f "$policy"' EXIT
  trap 'exit 130' INT TERM
  printf '#!/bin/sh\\nexit 101\\n' > "$policy"
  chmod 755 "$policy"
fi
apt-get update || echo 'The package lists could not be brought up to date: going on with those at hand.' >&2
apt-get install -y --no-install-recommends "$@"
if [ -d /run/systemd/system ] && [ "$1" = mariadb-server ]; then systemctl disable mariadb.service; fi
`;

/** Installs Debian packages as root or through sudo; `advice` says what else the user can do. */
export async function installPackages(packages, advice, note) {
  note('missing');
  if (!findProgram('apt-get')) throw new StepError(`There is no apt-get here to install it. ${advice}`);
  const isRoot = process.getuid() === 0;
  if (!isRoot && !findProgram('sudo')) {
    const command = `apt-get install ${packages.join(' ')}`;
    throw new StepError(`Neither root nor sudo is at hand to install it. As root: ${command}. ${advice}`);
  }
  note(`installing Debian's ${packages.join(', ')} ${isRoot ? 'as root' : 'with sudo'}`);
  const script = ['sh', '-c', INSTALL, 'install', ...packages];
  const command = isRoot ? script : ['sudo', ...(process.stdin.isTTY ? [] : ['-n']), ...script];
  await run(command[0], command.slice(1), {
    detached: isRoot,
    ending: { signal: 'SIGINT', group: isRoot, patience: 300_000 },
  });
}
