import { closeSync, existsSync, openSync, readFileSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { readCredentials } from './credentials.mjs';
import { findProgram, installPackages } from './debian.mjs';
import { makeDataDirectory } from './mariadb-data.mjs';
import { serverPlace } from './mariadb-place.mjs';
import { freePort } from './ports.mjs';
import { commandLine, endProcess, launch, run } from './processes.mjs';
import { forget, ownerIsAlive, recall, remember } from './records.mjs';
import { StepError, step } from './steps.mjs';
import { whenEnding } from './supervision.mjs';

const HOST = '127.0.0.1';
/** Owns the tables and changes their structure; the application itself comes as the other. */
const OWNER = 'roothertz';
const APPLICATION = 'roothertz_app';
const READY_WITHIN = 120_000;
const ADVICE = 'Install MariaDB 10.11 or newer yourself, or name an existing server with DB_HOST.';

const hasServer = () =>
  ['mariadbd', 'mariadb-install-db', 'mariadb'].every((program) => findProgram(program) !== undefined);

export function ensureMariadbInstalled() {
  return step('MariaDB server', async (note) => {
    if (hasServer()) return 'present';
    await installPackages(['mariadb-server'], ADVICE, note);
    if (!hasServer())
      throw new StepError(`mariadb-server is installed, but mariadbd is not found. ${ADVICE}`);
    return 'installed';
  });
}

/**
 * Starts the project's own MariaDB on `.local/<name>`, or takes over the one that a killed script left there.
 * Answers `{ host, port, socket, query(sql), environment(database), ownerEnvironment(database), stop() }`; it stops with the script. A server
 * that another running script of this checkout uses is shared, and left to that script to stop, unless `exclusive`.
 * @param {{ name: string, preferredPort: number, exclusive?: boolean, options?: string[] }} wanted
 */
export function startMariadb({ name, preferredPort, exclusive = false, options = [] }) {
  const place = serverPlace(name);
  return step('MariaDB', async (note) => {
    const found = await findRunning(place);
    if (found?.inUse && exclusive)
      throw new StepError(`Process ${found.owner} is using .local/${name} already.`);
    if (found?.inUse) return server(place, found.port, `shared with process ${found.owner}`, async () => {});
    if (found) remember(name, { pid: found.pid });
    const stop = stopOnce(place);
    whenEnding(stop);
    const port = found?.port ?? (await startOn(place, await freePort(preferredPort), options, note));
    return server(place, port, found ? 'taken over from a killed script' : 'started', stop);
  });
}

function server(place, port, origin, stop) {
  const query = (sql) => querySocket(place, sql);
  const { databasePassword, applicationPassword } = readCredentials();
  const reached = (database) => ({ DB_HOST: HOST, DB_PORT: String(port), DB_NAME: database });
  const environment = (database) => ({
    ...reached(database),
    DB_USER: APPLICATION,
    DB_PASSWORD: applicationPassword,
    DB_OWNER_USER: OWNER,
    DB_OWNER_PASSWORD: databasePassword,
  });
  const ownerEnvironment = (database) => ({
    ...reached(database),
    DB_USER: OWNER,
    DB_PASSWORD: databasePassword,
  });
  return {
    host: HOST,
    port,
    socket: place.socket,
    query,
    environment,
    ownerEnvironment,
    stop,
    outcome: `${origin}, ${HOST}:${port}`,
  };
}

/** A server on this directory that answers, or that a killed script left starting or stopping. */
async function findRunning(place) {
  const pid = runningPid(place);
  if (pid === undefined) return undefined;
  await untilReady(place, () => commandLine(pid) !== '');
  if (commandLine(pid) === '') return undefined;
  const port = Number(await querySocket(place, 'SELECT @@port'));
  const record = recall(place.name);
  return { pid, port, inUse: ownerIsAlive(record), owner: record?.owner };
}

function runningPid({ name, data, pidFile }) {
  const pids = [recall(name)?.pid, existsSync(pidFile) ? Number(readFileSync(pidFile, 'utf8')) : undefined];
  return pids.find((pid) => pid && commandLine(pid).includes(`--datadir=${data} `));
}

async function startOn(place, port, options, note) {
  if (!existsSync(place.data)) await makeDataDirectory(place, note);
  const log = openSync(place.log, 'a', 0o600);
  const { child, ended } = launch(findProgram('mariadbd'), serverArguments(place, port, options), {
    stdio: ['ignore', log, log],
  });
  closeSync(log);
  remember(place.name, { pid: child.pid });
  let alive = true;
  void ended.then(() => (alive = false));
  if (!(await untilReady(place, () => alive))) throw new StepError(refusal(place));
  return port;
}

/** `--no-defaults` must come first: nothing of the machine's own configuration may leak in. */
function serverArguments({ data, socket, pidFile, user }, port, options) {
  return [
    '--no-defaults',
    `--datadir=${data}`,
    `--socket=${socket}`,
    `--pid-file=${pidFile}`,
    `--port=${port}`,
    `--bind-address=${HOST}`,
    `--user=${user}`,
    '--skip-name-resolve',
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--default-time-zone=+00:00',
    '--local-infile=0',
    ...options,
  ];
}

async function untilReady(place, mayBecomeReady) {
  for (const until = Date.now() + READY_WITHIN; mayBecomeReady() && Date.now() < until; await delay(100)) {
    if (existsSync(place.socket) && (await answers(place))) return true;
  }
  return false;
}

async function answers(place) {
  try {
    return (await querySocket(place, 'SELECT 1')).trim() === '1';
  } catch (error) {
    if (error instanceof StepError) return false;
    throw error;
  }
}

function querySocket({ socket, user }, sql) {
  return run(
    findProgram('mariadb'),
    ['--no-defaults', '--batch', '--skip-column-names', `--socket=${socket}`, `--user=${user}`],
    { input: sql },
  );
}

function refusal({ log }) {
  const lines = readFileSync(log, 'utf8').trim().split('\n');
  const telling = lines.filter((line) => line.includes('[ERROR]'));
  return `MariaDB did not start (${log}):\n${(telling.length > 0 ? telling : lines).slice(-5).join('\n')}`;
}

function stopOnce(place) {
  let stopping;
  const stop = async () => {
    const pid = runningPid(place);
    if (pid) await step('MariaDB', () => endProcess(pid, { patience: 60_000 }).then(() => 'stopped'));
    forget(place.name);
  };
  return () => (stopping ??= stop());
}

/**
 * Makes a database and the project's two accounts: the owner of every database of this server whose name begins with its
 * own, and the application's, which has no right until the owner grants it some.
 */
export function createDatabase(server, name, { fresh = false, makesAccounts = false } = {}) {
  const { databasePassword, applicationPassword } = readCredentials();
  const owner = `'${OWNER}'@'${HOST}'`;
  const application = `'${APPLICATION}'@'${HOST}'`;
  return server.query(`
    ${fresh ? `DROP DATABASE IF EXISTS \`${name}\`;` : ''}
    CREATE DATABASE IF NOT EXISTS \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;
    CREATE USER IF NOT EXISTS ${owner}, ${application};
    ALTER USER ${owner} IDENTIFIED BY '${databasePassword}', ${application} IDENTIFIED BY '${applicationPassword}';
    GRANT ALL PRIVILEGES ON \`${OWNER}%\`.* TO ${owner} WITH GRANT OPTION;
    ${makesAccounts ? `GRANT CREATE USER ON *.* TO ${owner};` : ''}
  `);
}
