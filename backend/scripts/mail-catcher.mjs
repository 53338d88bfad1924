import { setTimeout as delay } from 'node:timers/promises';
import { inRoot } from './paths.mjs';
import { freePort } from './ports.mjs';
import { endProcess, launch } from './processes.mjs';
import { forget, remember } from './records.mjs';
import { StepError, step } from './steps.mjs';
import { whenEnding } from './supervision.mjs';

const MAILDEV = inRoot('node_modules', 'maildev', 'dist', 'bin', 'maildev.js');
const HOST = '127.0.0.1';
const READY_WITHIN = 30_000;
const MOST_KEPT = 1000;

/**
 * Starts a mail server that keeps what it is given and shows it on a page of its own, in memory only.
 * Answers `{ url, environment }`: where to read, and the variables with which the application sends to it.
 * @param {{ name: string, preferredPorts: { smtp: number, web: number } }} wanted
 */
export function startMailCatcher({ name, preferredPorts }) {
  return step('Mail catcher', async () => {
    const smtp = await freePort(preferredPorts.smtp);
    const web = await freePort(preferredPorts.web);
    const { child, ended } = launch(process.execPath, [MAILDEV, ...argumentsFor(smtp, web)], {
      cwd: inRoot(),
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    remember(name, { pid: child.pid, mark: MAILDEV });
    whenEnding(async () => {
      if (child.pid) await endProcess(child.pid);
      forget(name);
    });
    const url = `http://${HOST}:${web}`;
    await untilReady(url, ended);
    const environment = { SMTP_HOST: HOST, SMTP_PORT: String(smtp) };
    return { url, environment, outcome: `started, ${url} (SMTP on ${smtp})` };
  });
}

function argumentsFor(smtp, web) {
  const places = ['--ip', HOST, '--smtp', String(smtp), '--web-ip', HOST, '--web', String(web)];
  return [...places, '--max-emails', String(MOST_KEPT), '--silent'];
}

async function untilReady(url, ended) {
  let end;
  void ended.then((reason) => (end = reason));
  for (const until = Date.now() + READY_WITHIN; Date.now() < until; await delay(100)) {
    if (end) throw new StepError(`The mail catcher ended with code ${end.code} before it was ready.`);
    const response = await fetch(`${url}/api/healthz`, { signal: AbortSignal.timeout(5_000) }).catch(
      () => undefined,
    );
    if (response?.ok) return;
  }
  throw new StepError(`The mail catcher was not ready within ${READY_WITHIN / 1000} s.`);
}
