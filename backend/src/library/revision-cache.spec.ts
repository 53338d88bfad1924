import type { ReadableLibrary } from './library.service.js';
import { RevisionCache } from './revision-cache.js';

const library = (id: number, revision = 1): ReadableLibrary => ({ id, revision, library: 'team' });

describe('what is kept of libraries', () => {
  it('is loaded once at each revision, however many ask at once', async () => {
    const load = jest.fn(({ revision }: ReadableLibrary) => Promise.resolve(`parts at ${revision}`));
    const cache = new RevisionCache(load);
    const first = await Promise.all([cache.contentOf(library(1)), cache.contentOf(library(1))]);
    expect(first).toEqual(['parts at 1', 'parts at 1']);
    expect(load).toHaveBeenCalledTimes(1);
    expect(await cache.contentOf(library(1, 2))).toBe('parts at 2');
    expect(load).toHaveBeenCalledTimes(2);
  });

  it('is asked for anew where loading failed', async () => {
    const load = jest.fn().mockRejectedValueOnce(new Error('no database')).mockResolvedValueOnce('parts');
    const cache = new RevisionCache<string>(load);
    await expect(cache.contentOf(library(1))).rejects.toThrow('no database');
    expect(await cache.contentOf(library(1))).toBe('parts');
  });

  it('is let go for the library that was asked for longest ago, past fifty', async () => {
    const load = jest.fn(({ id }: ReadableLibrary) => Promise.resolve(id));
    const cache = new RevisionCache(load);
    for (let id = 1; id <= 50; id += 1) await cache.contentOf(library(id));
    await cache.contentOf(library(1));
    await cache.contentOf(library(51));
    load.mockClear();
    await cache.contentOf(library(1));
    expect(load).not.toHaveBeenCalled();
    await cache.contentOf(library(2));
    expect(load).toHaveBeenCalledTimes(1);
  });
});
