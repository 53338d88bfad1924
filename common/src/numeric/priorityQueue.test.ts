import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { PriorityQueue } from './priorityQueue.js';

describe('PriorityQueue', () => {
  it('hands out in ascending order, equal keys as they came', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.constantFrom(0, 1, 2, Infinity), fc.nat(3))), (keys) => {
        const queue = new PriorityQueue<number>();
        keys.forEach((key, turn) => queue.add(key, turn));
        const rank = ([first, second]: [number, number]) => Math.min(first, 9) * 10 + second;
        const sorted = [...keys.keys()].sort((a, b) => rank(keys[a]) - rank(keys[b]) || a - b);
        expect(keys.map(() => queue.take())).toEqual(sorted);
        expect(queue.take()).toBeUndefined();
      }),
      { seed: 1 },
    );
  });
});
