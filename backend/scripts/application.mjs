import { setTimeout as delay } from 'node:timers/promises';
import { inRoot } from './paths.mjs';
import { portTrouble } from './ports.mjs';
import { endProcess, launch, run } from './processes.mjs';
import { forget, ownerIsAlive, recall, remember } from './records.mjs';
import { StepError, step } from './steps.mjs';
import { whenEnding } from './supervision.mjs';

const MAIN = inRoot('backend', 'dist', 'main.js');
const PREPARE = inRoot('backend', 'dist', 'database', 'prepare.js');
const HEALTHY_WITHIN = 120_000;
/**
 * In MiB. Where its heap may take gigabytes, V8 lets it grow fourfold before it collects; and what waits for the
 * database outlives a small young space though it is soon garbage.
 */
const HEAP = ['--max-old-space-size=1536', '--max-semi-space-size=32'];

export function readAddress({ HOST = '127.0.0.1', PORT = '3000' }) {
  const port = Number(PORT);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new StepError(`PORT must be a whole number from 1 to 65535, but is ${JSON.stringify(PORT)}.`);
  }
  return { host: HOST, port, url: `http://${nameOf(HOST)}:${port}` };
}

/** Where this machine reaches a server that listens on `host`. */
function nameOf(host) {
  if (host === '0.0.0.0' || host === '::') return 'localhost';
  return host.includes(':') ? `[${host}]` : host;
}

export async function refuseTakenPort({ host, port }) {
  const trouble = await portTrouble(port, host);
  if (trouble === undefined) return;
  throw new StepError(`Port ${port} on ${host} ${whyTaken(port, trouble)}: set PORT to another one.`);
}

function whyTaken(port, trouble) {
  if (trouble !== 'EADDRINUSE') return `can't be used (${trouble})`;
  const record = recall(`application-${port}`);
  if (ownerIsAlive(record)) return `is where Roothertz runs already, started by process ${record.owner}`;
  return 'is taken by another program';
}

export function prepareDatabase(environment) {
  return step('Database', async (note) => {
    note(`preparing ${environment.DB_NAME ?? 'the database'}`);
    const output = await run(process.execPath, [PREPARE], { cwd: inRoot(), env: environment });
    return output.trim().split('\n').join('; ') || 'ready';
  });
}

/**
 * Starts the server and waits until it is healthy; answers `{ ended }`, a promise of its end. The owner of the tables
 * stays unknown to it.
 */
export async function serve(address, { DB_OWNER_USER, DB_OWNER_PASSWORD, ...environment }) {
  const env = { ...environment, HOST: address.host, PORT: String(address.port) };
  const { child, ended } = launch(process.execPath, [...HEAP, MAIN], { cwd: inRoot(), env });
  const record = `application-${address.port}`;
  remember(record, { pid: child.pid, mark: MAIN });
  whenEnding(async () => {
    if (child.pid) await endProcess(child.pid);
    forget(record);
  });
  await untilHealthy(address, ended);
  return { ended };
}

async function untilHealthy({ url }, ended) {
  let end;
  void ended.then((reason) => (end = reason));
  for (const until = Date.now() + HEALTHY_WITHIN; Date.now() < until; await delay(150)) {
    if (end) throw new StepError(`The server ended with code ${end.code} before it was ready.`);
    if (await isHealthy(url)) return;
  }
  throw new StepError(`The server did not become healthy within ${HEALTHY_WITHIN / 1000} s.`);
}

async function isHealthy(url) {
  try {
    const response = await fetch(`${url}/api/health`, { signal: AbortSignal.timeout(5_000) });
    return response.status === 200;
  } catch {
    return false;
  }
}
