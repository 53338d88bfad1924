import { prepareDatabase, readAddress, refuseTakenPort, serve } from './application.mjs';
import { buildStale } from './builds.mjs';
import { readCredentials } from './credentials.mjs';
import { startMailCatcher } from './mail-catcher.mjs';
import { createDatabase, ensureMariadbInstalled, startMariadb } from './mariadb.mjs';
import { endOrphans } from './orphans.mjs';
import { ensurePackages, refuseOldNode } from './packages.mjs';
import { startPayments } from './payments.mjs';
import { say } from './steps.mjs';
import { expectStop, refuseWhenEnding, supervise } from './supervision.mjs';

const DATABASE = 'roothertz';
const DEMO_ROLES = ['admin', 'librarian', 'purchasing', 'engineer', 'reviewer'];

await supervise(async () => {
  refuseOldNode();
  const address = readAddress(process.env);
  await endOrphans();
  await refuseTakenPort(address);
  if (!process.env.DB_HOST) await ensureMariadbInstalled();
  await ensurePackages();
  const environment = { JWT_SECRET: readCredentials().jwtSecret, ...process.env, ...(await database()) };
  await buildStale(['common', 'backend', 'frontend']);
  await prepareDatabase(environment);
  const mail = await mailCatcher();
  const payments = await paymentStandIn(address);
  const { ended } = await serve(address, { ...environment, ...mail?.environment, ...payments?.environment });
  expectStop();
  welcome(address, mail, payments);
  const { code } = await ended;
  refuseWhenEnding();
  say(`The server ended with code ${code}.`);
  return code || 1;
});

/** An existing server named by DB_HOST, or the project's own. */
async function database() {
  if (process.env.DB_HOST) {
    say(`MariaDB: the server at ${process.env.DB_HOST}, from DB_HOST`);
    return {};
  }
  const server = await startMariadb({ name: 'mariadb', preferredPort: 33306 });
  await createDatabase(server, DATABASE);
  return server.environment(DATABASE);
}

/** Not in production, nor where SMTP_HOST names a mail server. */
async function mailCatcher() {
  const { NODE_ENV, SMTP_HOST } = process.env;
  if (NODE_ENV === 'production' || SMTP_HOST) return undefined;
  return startMailCatcher({ name: 'mail', preferredPorts: { smtp: 33_025, web: 33_080 } });
}

/** Not in production, nor where STRIPE_SECRET_KEY opens the service itself. */
async function paymentStandIn(address) {
  const { NODE_ENV, STRIPE_SECRET_KEY } = process.env;
  if (NODE_ENV === 'production' || STRIPE_SECRET_KEY) return undefined;
  return startPayments({ name: 'payments', preferredPort: 33_090, address });
}

function welcome({ url }, mail, payments) {
  say(`\nRoothertz is ready: ${url}  (Ctrl-C stops it)`);
  if (mail) say(`E-mails that it sends are caught and shown at ${mail.url}`);
  if (payments) say(`Plans are paid at a local stand-in of the payment service: ${payments.url}`);
  if (process.env.NODE_ENV === 'production') return;
  say('Demo accounts, all with the password quiet-bench-2026:');
  for (const role of DEMO_ROLES) say(`  ${role}@tarnfield.example`);
}
