import { afterEach, describe, expect, it, vi } from 'vitest';
import { fontSheet } from './fontSheet';

afterEach(() => vi.unstubAllGlobals());

function answerWith(answer: () => Response) {
  const asked = vi.fn((_url: string) => Promise.resolve(answer()));
  vi.stubGlobal('fetch', asked);
  return asked;
}

describe('the font of a saved drawing', () => {
  it('comes with it, in both weights and with the Greek letters', async () => {
    const asked = answerWith(() => new Response('font'));
    const sheet = await fontSheet();
    expect(asked).toHaveBeenCalledTimes(4);
    expect(sheet.match(/src:url\(data:font\/woff2;base64,Zm9udA==\) format\('woff2'\)/g)).toHaveLength(4);
    expect(sheet.match(/font-weight:600/g)).toHaveLength(2);
    expect(sheet.match(/unicode-range:U\+0370-03FF/g)).toHaveLength(2);
  });

  it('is left out where it can’t be had', async () => {
    answerWith(() => new Response(null, { status: 404 }));
    expect(await fontSheet()).toBe('');
  });
});
