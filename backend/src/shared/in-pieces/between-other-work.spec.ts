import { betweenOtherWork } from './between-other-work.js';

describe('long work', () => {
  it('lets what waits go first after each of its pieces', async () => {
    const order: string[] = [];
    function* pieces() {
      for (const piece of ['one', 'two']) {
        order.push(piece);
        setImmediate(() => order.push(`after ${piece}`));
        yield;
      }
      return 'result';
    }
    expect(await betweenOtherWork(pieces())).toBe('result');
    expect(order).toEqual(['one', 'after one', 'two', 'after two']);
  });
});
