import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { PriorityQueue } from './priorityQueue.js';

describe('PriorityQueue', () => {
  it('hands out in ascending order, equal keys as they came', () => {
    fc.assert(
      fc.property(fc.array(fc.nat(9)), (keys) => {
        const queue = new PriorityQueue<[number, number]>();
        keys.forEach((key, turn) => queue.add(key, [key, turn]));
        const sorted = keys
          .map((key, turn): [number, number] => [key, turn])
          .sort((a, b) => a[0] - b[0] || a[1] - b[1]);
        expect(keys.map(() => queue.take())).toEqual(sorted);
        expect(queue.take()).toBeUndefined();
      }),
      { seed: 1 },
    );
  });
});
