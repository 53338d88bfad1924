import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { smallestPositions } from './smallest.js';

function bySorting(keys: readonly number[], count: number): number[] {
  const rank = (position: number) => (Number.isNaN(keys[position]) ? Infinity : keys[position]);
  const order = [...keys.keys()].sort((a, b) => (rank(a) < rank(b) ? -1 : rank(a) > rank(b) ? 1 : a - b));
  return order.slice(0, count);
}

describe('smallestPositions', () => {
  it('gives the positions of the smallest keys in ascending order', () => {
    expect([...smallestPositions(Float64Array.of(5, 1, 4, 2, 3), 3)]).toEqual([1, 3, 4]);
  });

  it('leaves equal keys in the order of their positions', () => {
    expect([...smallestPositions(Float64Array.of(2, 1, 2, 1, 2, 1), 5)]).toEqual([1, 3, 5, 0, 2]);
  });

  it('puts keys that are NaN last', () => {
    expect([...smallestPositions(Float64Array.of(NaN, 3, NaN, -1), 4)]).toEqual([3, 1, 0, 2]);
  });

  it('gives all where more are wanted than there are, and none where none are', () => {
    expect([...smallestPositions(Float64Array.of(2, 1), 10)]).toEqual([1, 0]);
    expect([...smallestPositions(Float64Array.of(2, 1), 0)]).toEqual([]);
    expect([...smallestPositions(new Float64Array(0), 5)]).toEqual([]);
  });

  it('leaves the keys as they were', () => {
    const keys = Float64Array.of(3, NaN, 1, 2);
    smallestPositions(keys, 2);
    expect([...keys]).toEqual([3, NaN, 1, 2]);
  });

  it('agrees with a full sort on any keys with many ties', () => {
    const key = fc.oneof(fc.integer({ min: 0, max: 5 }), fc.double(), fc.constantFrom(NaN, -0, 0, Infinity));
    fc.assert(
      fc.property(fc.array(key, { maxLength: 300 }), fc.nat(320), (keys, count) => {
        expect([...smallestPositions(Float64Array.from(keys), count)]).toEqual(bySorting(keys, count));
      }),
      { seed: 1961, numRuns: 300 },
    );
  });
});
