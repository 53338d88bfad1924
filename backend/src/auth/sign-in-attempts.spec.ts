import { SignInAttempts } from './sign-in-attempts.js';

const START = Date.UTC(2026, 0, 5);

function failTimes(attempts: SignInAttempts, times: number, now = START): void {
  for (let time = 0; time < times; time++) attempts.recordFailure('ada|10.0.0.1', now);
}

describe('SignInAttempts', () => {
  it('hears five attempts at once and then makes the next wait', () => {
    const attempts = new SignInAttempts();
    failTimes(attempts, 4);
    expect(attempts.waitSeconds('ada|10.0.0.1', START)).toBe(0);
    failTimes(attempts, 1);
    expect(attempts.waitSeconds('ada|10.0.0.1', START)).toBe(5);
  });

  it('doubles the wait with every further failure, up to a quarter of an hour', () => {
    const attempts = new SignInAttempts();
    failTimes(attempts, 7);
    expect(attempts.waitSeconds('ada|10.0.0.1', START)).toBe(20);
    failTimes(attempts, 30);
    expect(attempts.waitSeconds('ada|10.0.0.1', START)).toBe(900);
  });

  it('hears the account again when the wait is over', () => {
    const attempts = new SignInAttempts();
    failTimes(attempts, 5);
    expect(attempts.waitSeconds('ada|10.0.0.1', START + 5_000)).toBe(0);
  });

  it('counts each account and each address for itself', () => {
    const attempts = new SignInAttempts();
    failTimes(attempts, 9);
    expect(attempts.waitSeconds('ada|10.0.0.2', START)).toBe(0);
    expect(attempts.waitSeconds('bob|10.0.0.1', START)).toBe(0);
  });

  it('forgets the failures after a success, and a quarter of an hour after the last wait', () => {
    const attempts = new SignInAttempts();
    failTimes(attempts, 9);
    attempts.recordSuccess('ada|10.0.0.1');
    expect(attempts.waitSeconds('ada|10.0.0.1', START)).toBe(0);
    failTimes(attempts, 9);
    failTimes(attempts, 1, START + 3_600_000);
    expect(attempts.waitSeconds('ada|10.0.0.1', START + 3_600_000)).toBe(0);
  });

  it('keeps no more than ten thousand accounts in mind', () => {
    const attempts = new SignInAttempts();
    failTimes(attempts, 9);
    for (let other = 0; other < 10_000; other++) attempts.recordFailure(`other${other}`, START);
    expect(attempts.waitSeconds('ada|10.0.0.1', START)).toBe(0);
  });
});
