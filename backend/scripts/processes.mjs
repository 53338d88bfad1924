import { spawn } from 'node:child_process';
import { readFileSync, readlinkSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { StepError } from './steps.mjs';
import { refuseWhenEnding, whenEnding } from './supervision.mjs';

/** A process's command line; empty when it has ended, even when nobody has collected it yet. */
export function commandLine(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').join(' ').trim();
  } catch {
    return '';
  }
}

export function workingDirectory(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return '';
  }
}

function signalProcess(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH' && error.code !== 'EPERM') throw error;
  }
}

async function gone(pid, patience) {
  for (const until = Date.now() + patience; Date.now() < until; await delay(50)) {
    if (commandLine(pid) === '') return true;
  }
  return commandLine(pid) === '';
}

/** Asks a process (or, with `group`, all of its group) to end, and insists after `patience` milliseconds. */
export async function endProcess(pid, { signal = 'SIGTERM', group = false, patience = 15_000 } = {}) {
  if (commandLine(pid) === '') return;
  const target = group ? -pid : pid;
  signalProcess(target, signal);
  if (await gone(pid, patience)) return;
  signalProcess(target, 'SIGKILL');
  await gone(pid, 5_000);
}

/**
 * Starts a process in a group of its own, so that Ctrl-C reaches this script alone and the script decides
 * the order in which things stop.
 */
export function launch(command, args, options = {}) {
  refuseWhenEnding();
  const child = spawn(command, args, { stdio: ['ignore', 'inherit', 'inherit'], detached: true, ...options });
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve({ code: 127, error }));
    child.once('close', (code, signal) => resolve({ code: code ?? 1, signal }));
  });
  return { child, ended };
}

/** Waits for a launched process, and ends it when the script ends first. */
export async function runToEnd({ child, ended }, ending = { group: true }) {
  const forget = whenEnding(() => child.pid && endProcess(child.pid, ending));
  const end = await ended;
  refuseWhenEnding();
  forget();
  return end;
}

/** Runs a command quietly; answers its standard output, and refuses with all of its output when it fails. */
export async function run(command, args, { input, ending, ...options } = {}) {
  const started = launch(command, args, { ...options, stdio: [input ? 'pipe' : 'ignore', 'pipe', 'pipe'] });
  const output = { stdout: '', all: '' };
  for (const stream of ['stdout', 'stderr']) {
    started.child[stream].setEncoding('utf8').on('data', (text) => {
      output.all += text;
      if (stream === 'stdout') output.stdout += text;
    });
  }
  started.child.stdin?.on('error', () => {}).end(input);
  const { code, error } = await runToEnd(started, ending);
  if (code === 0) return output.stdout;
  throw new StepError(error?.message ?? `${command} ended with code ${code}:\n${output.all.trim()}`);
}

/** The most memory that a process has held at once, in MiB. */
export function peakMemory(pid) {
  const [, kibibytes] = readFileSync(`/proc/${pid}/status`, 'utf8').match(/^VmHWM:\s+(\d+) kB$/m);
  return Math.round(Number(kibibytes) / 1024);
}
