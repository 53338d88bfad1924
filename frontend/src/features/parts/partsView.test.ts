import { describe, expect, it } from 'vitest';
import { opAmp } from '../../test/factories';
import { partsFacts } from './partsFacts';
import { isNarrowed, readPartsView } from './partsView';

describe('what the address says of the list', () => {
  it('is read with its filters and its order', () => {
    const address = new URLSearchParams(
      'search=vr&library=team&lifecycle=active,obsolete&sort=-currentNoise',
    );
    expect(readPartsView(address)).toEqual({
      search: 'vr',
      library: ['team'],
      lifecycle: ['active', 'obsolete'],
      sort: '-currentNoise',
    });
  });

  it('leaves out words that mean nothing', () => {
    const address = new URLSearchParams('library=stolen&approval=&sort=password');
    expect(readPartsView(address)).toEqual({ search: '' });
    expect(isNarrowed(readPartsView(address))).toBe(false);
  });
});

describe('the facts of the list', () => {
  const curated = opAmp({ library: 'curated' });
  const unknown = opAmp({ amplifier: { ...opAmp().amplifier, currentNoise: null } });
  const list = { isPending: false, error: null, retry: () => undefined };

  it('count the libraries and the gaps', () => {
    const facts = partsFacts({ ...list, parts: [curated, unknown], total: 2, isComplete: true }, false);
    expect(facts).toBe('2 parts: 1 curated, 1 of your own; 1 without current noise');
  });

  it('say that the list goes on', () => {
    const facts = partsFacts({ ...list, parts: [curated], total: 100_243, isComplete: false }, false);
    expect(facts).toBe('100\u2009243 parts, of which the first 1 are shown: search for the others');
  });

  it('say how many were found', () => {
    const facts = partsFacts({ ...list, parts: [curated], total: 283, isComplete: true }, true);
    expect(facts).toBe('1 part found among 283 parts');
  });
});
