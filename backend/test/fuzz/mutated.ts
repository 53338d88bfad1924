import fc from 'fast-check';
import { hostileValue } from './hostile.js';

type Path = readonly string[];
type Change = (body: unknown) => unknown;

/** The sample with up to three of its values replaced, left out or joined by one that nobody knows. */
export function mutated(sample: unknown): fc.Arbitrary<unknown> {
  const change = fc.constantFrom(...pathsOf(sample)).chain((path) => changeAt(path));
  return fc
    .array(change, { maxLength: 3 })
    .map((changes) => changes.reduce((body, apply) => apply(body), structuredClone(sample)));
}

function changeAt(path: Path): fc.Arbitrary<Change> {
  const anyDecade = fc.double({ min: -30, max: 30, noNaN: true }).map((decade) => 10 ** decade);
  return fc.oneof(
    { weight: 3, arbitrary: hostileValue.map((value) => (body: unknown) => withValue(body, path, value)) },
    { weight: 3, arbitrary: anyDecade.map((value) => (body: unknown) => withValue(body, path, value)) },
    { weight: 1, arbitrary: fc.constant((body: unknown) => withValue(body, path, undefined)) },
    { weight: 1, arbitrary: fc.constant((body: unknown) => withValue(body, [...path, 'colour'], 'red')) },
  );
}

/** The paths of all values in a body, the body itself included. */
function pathsOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  return [path, ...Object.entries(value).flatMap(([key, item]) => pathsOf(item, [...path, key]))];
}

function withValue(body: unknown, [key, ...rest]: Path, value: unknown): unknown {
  if (key === undefined) return value;
  if (typeof body !== 'object' || body === null) return body;
  const changed = (body as Record<string, unknown>)[key];
  return Object.assign(Array.isArray(body) ? [...body] : { ...body }, {
    [key]: withValue(changed, rest, value),
  });
}
