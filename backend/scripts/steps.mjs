/** A refusal with a text for the person at the terminal: shown without a stack. */
export class StepError extends Error {}

let lineIsOpen = false;

function write(text) {
  process.stdout.write(text);
  lineIsOpen = !text.endsWith('\n');
}

export function endLine() {
  if (lineIsOpen) write('\n');
}

export function say(text) {
  endLine();
  write(`${text}\n`);
}

/**
 * One step on one line as it happens: the title at once, what the action notes meanwhile, then its outcome.
 */
export async function step(title, action) {
  endLine();
  write(`${title}: `);
  const result = await action((note) => write(`${note} … `));
  write(`${result.outcome ?? result}\n`);
  return result;
}

export async function timed(action) {
  const started = Date.now();
  await action();
  return `done in ${Math.max(1, Math.round((Date.now() - started) / 1000))} s`;
}
