import { createServer } from 'node:net';
import { StepError } from './steps.mjs';

/** Why a port can't be listened on, as the system's error code; undefined when it is free. */
export function portTrouble(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', (error) => resolve(error.code));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(undefined)));
  });
}

export async function freePort(preferred, host) {
  for (let port = preferred; port < preferred + 100; port += 1) {
    if ((await portTrouble(port, host)) === undefined) return port;
  }
  throw new StepError(`No free port between ${preferred} and ${preferred + 99}.`);
}
