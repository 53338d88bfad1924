import { setImmediate as otherWork } from 'node:timers/promises';

/** Does long work piece by piece, and lets whatever waits for the server's thread go first after each. */
export async function betweenOtherWork<Result>(pieces: Generator<void, Result>): Promise<Result> {
  for (;;) {
    const { done, value } = pieces.next();
    if (done) return value;
    await otherWork();
  }
}
