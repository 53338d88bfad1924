import { constants } from 'node:os';
import { StepError, endLine, say } from './steps.mjs';

const SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'];
const closers = [];
let ending = false;
let stopIsExpected = false;

/** Registers what must be closed when the script ends, however it ends; answers a function that forgets it. */
export function whenEnding(closer) {
  closers.push(closer);
  return () => {
    const index = closers.indexOf(closer);
    if (index >= 0) closers.splice(index, 1);
  };
}

/** From here on a signal is the ordinary way to stop: it ends with exit code 0. */
export function expectStop() {
  stopIsExpected = true;
}

export function refuseWhenEnding() {
  if (ending) throw new StepError('Stopping.');
}

/** Closes in the opposite order of opening. */
export async function closeAll() {
  while (closers.length > 0) {
    try {
      await closers.pop()();
    } catch (error) {
      say(`While stopping: ${error.message}`);
    }
  }
}

async function finish(code, words) {
  if (ending) return;
  ending = true;
  endLine();
  if (words) say(words);
  await closeAll();
  process.exit(code);
}

function watchSignals() {
  for (const signal of SIGNALS) {
    process.on(signal, () => {
      const code = stopIsExpected ? 0 : 128 + constants.signals[signal];
      void finish(code, 'Stopping …');
    });
  }
  process.stdout.on('error', () => {});
  process.stderr.on('error', () => {});
}

/** Runs a script: signals and failures alike close everything that it opened. */
export async function supervise(main) {
  watchSignals();
  try {
    await finish(await main());
  } catch (error) {
    await finish(1, error instanceof StepError ? error.message : error.stack);
  }
}
