import { describe, expect, it } from 'vitest';
import { deviceWords } from './deviceWords';

const CHROME =
  'Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0 Safari/537.36';

describe('deviceWords', () => {
  it.each([
    [CHROME, 'Chrome on Windows'],
    [`${CHROME} Edg/140.0`, 'Edge on Windows'],
    ['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Linux'],
    [
      'Mozilla/5.0 (iPhone; CPU iPhone OS 18_0 like Mac OS X) Version/18.0 Mobile Safari/604.1',
      'Safari on iOS',
    ],
    ['curl/8.5.0', 'curl/8.5.0'],
    ['', 'Unknown program'],
  ])('of %s says %s', (userAgent, words) => {
    expect(deviceWords(userAgent)).toBe(words);
  });
});
