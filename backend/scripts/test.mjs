import { randomBytes } from 'node:crypto';
import { buildStale } from './builds.mjs';
import { ensureChromium } from './chromium.mjs';
import { ensureMariadbInstalled, startMariadb } from './mariadb.mjs';
import { ensureNgspice } from './ngspice.mjs';
import { endOrphans } from './orphans.mjs';
import { ensurePackages, refuseOldNode } from './packages.mjs';
import { addUp, summary } from './results.mjs';
import { StepError, say } from './steps.mjs';
import { SUITES } from './suites.mjs';
import { closeAll, refuseWhenEnding, supervise } from './supervision.mjs';

/** Data that each run makes afresh needs no safety from a power cut. */
const QUICK = ['--innodb-flush-log-at-trx-commit=0', '--innodb-doublewrite=0'];

/** Settings of the application in the caller's environment, which must not steer the tests. */
const OWN_SETTINGS =
  /^(DB_.*|PORT|HOST|NODE_ENV|JWT_SECRET|PUBLIC_ORIGIN|TRUST_PROXY|SMTP_.*|MAIL_FROM|STRIPE_.*)$/;

await supervise(async () => {
  const names = readNames(process.argv.slice(2));
  const counts = await runSuites(names);
  await closeAll();
  const total = addUp(counts);
  say(summary(total));
  return total.failures.length === 0 ? 0 : 1;
});

async function runSuites(names) {
  const context = await setUp(names.map((name) => SUITES[name])).catch(asFailure);
  if (context.failures) return [context];
  const counts = [];
  for (const name of names) counts.push(await runSuite(name, context));
  return counts;
}

function readNames(names) {
  const known = Object.keys(SUITES);
  const unknown = names.find((name) => !known.includes(name));
  if (unknown) throw new StepError(`There is no suite "${unknown}": choose from ${known.join(', ')}.`);
  return names.length > 0 ? known.filter((name) => names.includes(name)) : known;
}

async function setUp(wanted) {
  refuseOldNode();
  await endOrphans();
  const needsDatabase = wanted.some((suite) => suite.needsDatabase);
  if (needsDatabase) await ensureMariadbInstalled();
  const chromium = wanted.some((suite) => suite.needsChromium) ? await ensureChromium() : undefined;
  const ngspice = wanted.some((suite) => suite.needsNgspice) ? await ensureNgspice() : undefined;
  await ensurePackages();
  await buildStale(['common']);
  const server = needsDatabase ? await startTestServer() : undefined;
  return { server, chromium, ngspice, environment: testEnvironment() };
}

function startTestServer() {
  return startMariadb({ name: 'mariadb-test', preferredPort: 33316, exclusive: true, options: QUICK });
}

function testEnvironment() {
  const kept = Object.entries(process.env).filter(([key]) => !OWN_SETTINGS.test(key));
  return { ...Object.fromEntries(kept), JWT_SECRET: randomBytes(32).toString('base64url') };
}

/** A suite that can't even start fails as one, and the others still run. */
async function runSuite(name, context) {
  say(`\n── ${name} ──`);
  try {
    return await SUITES[name].run(context);
  } catch (error) {
    return asFailure(error);
  }
}

function asFailure(error) {
  refuseWhenEnding();
  return { passed: 0, failures: [error instanceof StepError ? error.message : error.stack] };
}
