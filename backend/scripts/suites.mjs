import { mkdirSync, rmSync } from 'node:fs';
import { prepareDatabase, readAddress, serve } from './application.mjs';
import { buildStale } from './builds.mjs';
import { startMailCatcher } from './mail-catcher.mjs';
import { createDatabase } from './mariadb.mjs';
import { inLocal, inRoot } from './paths.mjs';
import { startPayments } from './payments.mjs';
import { freePort } from './ports.mjs';
import { launch, runToEnd } from './processes.mjs';
import { forget, readJson, remember } from './records.mjs';
import { countResults } from './results.mjs';

const PREFERRED_E2E_PORT = 33_320;
const PREFERRED_MAIL_PORTS = { smtp: 33_026, web: 33_081 };
const PAYMENTS = { name: 'payments-test', preferredPort: 33_091 };

/** Each suite answers how many of its tests passed and failed. */
export const SUITES = {
  common: { needsNgspice: true, run: runCommon },
  backend: { needsDatabase: true, run: runBackend },
  frontend: { run: ({ environment }) => runVitest('frontend', [], environment) },
  e2e: { needsDatabase: true, needsChromium: true, run: runJourneys },
};

function runCommon({ ngspice, environment }) {
  return runVitest('common', [], { ...environment, NGSPICE_PATH: ngspice });
}

/** One of its tests kills a server of the built application. */
async function runBackend({ server, environment }) {
  await buildStale(['common', 'backend']);
  await createDatabase(server, 'roothertz_test', { fresh: true, makesAccounts: true });
  const env = { ...environment, NODE_ENV: 'test', ...server.ownerEnvironment('roothertz_test') };
  return runReporting('backend', (report) => ['jest', '--json', `--outputFile=${report}`], 'backend', env);
}

async function runJourneys({ server, chromium, environment }) {
  await buildStale(['common', 'backend', 'frontend']);
  await createDatabase(server, 'roothertz_e2e', { fresh: true });
  const env = { ...environment, ...server.environment('roothertz_e2e') };
  await prepareDatabase(env);
  const address = readAddress({ PORT: String(await freePort(PREFERRED_E2E_PORT)) });
  const mail = await startMailCatcher({ name: 'mail-test', preferredPorts: PREFERRED_MAIL_PORTS });
  const payments = await startPayments({ ...PAYMENTS, address, fresh: true });
  await serve(address, { ...env, ...mail.environment, ...payments.environment });
  const browser = {
    ...environment,
    E2E_BASE_URL: address.url,
    E2E_MAIL_URL: mail.url,
    CHROMIUM_PATH: chromium,
  };
  return runVitest('frontend', ['--config', 'e2e/vitest.config.ts'], browser, 'e2e');
}

function runVitest(folder, args, env, name = folder) {
  const reporters = ['--reporter=default', '--reporter=json'];
  const command = (report) => ['vitest', 'run', ...args, ...reporters, `--outputFile.json=${report}`];
  return runReporting(name, command, folder, env);
}

async function runReporting(name, command, folder, env) {
  mkdirSync(inLocal('results'), { recursive: true });
  const report = inLocal('results', `${name}.json`);
  rmSync(report, { force: true });
  const runner = launch('npx', ['--no', '--', ...command(report)], { cwd: inRoot(folder), env });
  remember(`runner-${name}`, { pid: runner.child.pid, mark: report });
  const { code } = await runToEnd(runner);
  forget(`runner-${name}`);
  return countResults(readJson(report), code);
}
