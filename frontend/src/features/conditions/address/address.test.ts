import { checkConditions, CONDITION_FIELDS, type RankingRequest } from '@roothertz/common/conditions';
import { APPROVALS, boundsError, INPUT_TYPES, LIBRARIES, LIFECYCLES } from '@roothertz/common/parts';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { exampleRequest } from '../exampleRequest';
import { hasStageField, STAGE_KINDS, type StageKind } from '../stageKind';
import { withValue } from '../requestPath';
import { QUANTITY_KEYS } from './addressKeys';
import { readAddress } from './readAddress';
import { writeAddress } from './writeAddress';

const read = (query: string) => readAddress(new URLSearchParams(query));

function valueOf(path: keyof typeof CONDITION_FIELDS): fc.Arbitrary<number> {
  const field = CONDITION_FIELDS[path];
  const low = field.bounds.from;
  if ('integer' in field) return fc.integer({ min: low, max: Math.min(field.bounds.to, 1e6) });
  return fc
    .double({ min: low, max: field.bounds.to, noNaN: true })
    .filter((value) => boundsError(field, value) === null);
}

const PATHS = Object.values(QUANTITY_KEYS);

function belongsTo(kind: StageKind, path: string): boolean {
  const [, part, field] = path.split('.');
  if (part === 'stage') return hasStageField(kind, field) && path !== 'conditions.stage.feedbackCapacitance';
  return path !== 'conditions.source.directCurrent' || kind === 'transimpedance';
}

const requests: fc.Arbitrary<RankingRequest> = fc.constantFrom(...STAGE_KINDS).chain((kind) => {
  const paths = PATHS.filter((path) => belongsTo(kind, path));
  const values = fc.tuple(...paths.map((path) => fc.option(valueOf(path), { nil: null })));
  const words = fc.record({
    library: fc.subarray([...LIBRARIES]),
    lifecycle: fc.subarray([...LIFECYCLES]),
    approval: fc.subarray([...APPROVALS]),
    inputType: fc.subarray([...INPUT_TYPES]),
    package: fc.string({ maxLength: 20 }),
    search: fc.string({ unit: 'grapheme', maxLength: 20 }),
  });
  return fc.tuple(values, words).map(([numbers, filter]) => {
    const withNumbers = numbers.reduce<RankingRequest>(
      (request, value, index) => (value === null ? request : withValue(request, paths[index], value)),
      exampleRequest(kind),
    );
    return Object.entries(filter).reduce(
      (request, [key, value]) => withValue(request, `filter.${key}`, value),
      withNumbers,
    );
  });
});

/** An undefined entry and a missing one are the same request. */
function plain(request: RankingRequest): unknown {
  return JSON.parse(JSON.stringify(request));
}

describe('address', () => {
  it('gives back every request that it was written from', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const back = readAddress(new URLSearchParams(writeAddress(request).toString()));
        expect(back?.errors).toEqual([]);
        expect(plain(back!.request)).toEqual(plain(request));
      }),
      { numRuns: 300 },
    );
  });

  it.each(STAGE_KINDS)('names only the stage where everything is as in the %s example', (kind) => {
    expect(writeAddress(exampleRequest(kind)).toString()).toBe(`stage=${kind}`);
    expect(checkConditions(exampleRequest(kind))).toEqual([]);
  });

  it('is short and readable', () => {
    const request = withValue(
      withValue(exampleRequest('non-inverting'), 'conditions.source.resistance', 4700),
      'conditions.source.temperature',
      285.15,
    );
    expect(writeAddress(withValue(request, 'filter.lifecycle', ['active', 'obsolete'])).toString()).toBe(
      'stage=non-inverting&rs=4.7k&ts=12C&life=active+obsolete',
    );
  });

  it('takes what a field takes', () => {
    expect(read('stage=follower&rs=4k7&cs=2.2nF&ts=77K')?.request.conditions.source).toMatchObject({
      resistance: 4700,
      capacitance: 2.2e-9,
      temperature: 77,
    });
  });

  it('holds both networks of an instrumentation stage', () => {
    const { stage } = read('stage=instrumentation&gain=20&rg=220&rd=2k2')!.request.conditions;
    expect(stage).toMatchObject({ gain: 20, gainResistance: 220, differenceResistance: 2200 });
  });

  it('holds nothing where it names no stage', () => {
    expect(read('')).toBeNull();
    expect(read('rs=4k7')).toBeNull();
  });

  it('falls back to the example and says at the field what it could not read', () => {
    const { request, errors } = read('stage=non-inverting&rs=4x7&gain=-3&life=active+born&f2=30k')!;
    expect(request.conditions.source.resistance).toBe(1000);
    expect(request.conditions.stage.gain).toBe(100);
    expect(request.filter).toBeUndefined();
    expect(request.conditions.band.upper).toBe(30e3);
    expect(errors.map(({ field }) => field)).toEqual([
      'conditions.source.resistance',
      'conditions.stage.gain',
      'filter.lifecycle',
    ]);
    expect(errors[0].message).toMatch(/^the address said “4x7”: .*resistance/);
  });

  it('names an unknown stage and leaves out what belongs to another stage', () => {
    expect(read('stage=cascode')).toMatchObject({ errors: [{ field: 'conditions.stage.topology' }] });
    expect(read('stage=difference&rl=1M&rd=1k')?.request).toEqual(exampleRequest('difference'));
    expect(read('stage=follower&gain=7&rf=1M')?.request).toEqual(exampleRequest('follower'));
  });
});
