import { relative } from 'node:path';
import { stripVTControlCharacters } from 'node:util';
import { inRoot } from './paths.mjs';

/** As much of a failure's message as says what was expected and where. */
const MESSAGE_LINES = 12;

/**
 * Counts a runner's JSON report (Jest's form, which Vitest writes too) and says what failed. A file that failed
 * without a failed test did not load; a runner that failed without saying why, or left no report, counts as one failure.
 */
export function countResults(report, exitCode) {
  const passed = report?.numPassedTests ?? 0;
  const failures = (report?.testResults ?? []).flatMap(failuresOfFile);
  const failedUnsaid = failures.length === 0 && (exitCode !== 0 || !report);
  return {
    passed,
    retried: (report?.testResults ?? []).flatMap((file) => told(file, passedAfterFailure)),
    failures: failedUnsaid ? [`A runner ended with ${exitCode} without saying why.`] : failures,
  };
}

function failuresOfFile(file) {
  const failures = told(file, ({ status }) => status === 'failed');
  if (file.status !== 'failed' || failures.length > 0) return failures;
  return [`${relative(inRoot(), file.name)} did not load\n${shortened(file.message)}`];
}

function passedAfterFailure({ status, failureMessages }) {
  return status === 'passed' && failureMessages.length > 0;
}

function told({ name, assertionResults }, matches) {
  const file = relative(inRoot(), name);
  return assertionResults
    .filter(matches)
    .map(({ fullName, failureMessages }) => `${file}: ${fullName}\n${shortened(failureMessages.join('\n'))}`);
}

function shortened(message) {
  const lines = stripVTControlCharacters(message).split('\n').slice(0, MESSAGE_LINES);
  return lines.map((line) => `    ${line}`).join('\n');
}

export function addUp(counts) {
  return {
    passed: counts.reduce((sum, { passed }) => sum + passed, 0),
    retried: counts.flatMap(({ retried = [] }) => retried),
    failures: counts.flatMap(({ failures }) => failures),
  };
}

/** What needed a second try and what failed, last of all, so that the end of a long output tells it. */
export function summary({ passed, retried, failures }) {
  const sections = [...section('Passed at the second try:', retried), ...section('Failed tests:', failures)];
  return [...sections, `${passed} passed, ${failures.length} failed`].join('\n');
}

function section(title, lines) {
  return lines.length > 0 ? [title, ...lines] : [];
}
