import { describe, expect, it } from 'vitest';
import { opAmp, resistor } from '../../test/factories';
import { OP_AMPS } from './opAmps';
import { partsFacts } from './partsFacts';
import { isNarrowed, readPartsView } from './partsView';
import { RESISTORS } from './resistors';

describe('what the address says of the list', () => {
  it('is read with its filters and its order', () => {
    const address = new URLSearchParams(
      'search=vr&library=team&lifecycle=active,obsolete&sort=-currentNoise',
    );
    expect(readPartsView(OP_AMPS, address)).toEqual({
      search: 'vr',
      library: ['team'],
      lifecycle: ['active', 'obsolete'],
      sort: '-currentNoise',
    });
  });

  it('leaves out words that mean nothing', () => {
    const address = new URLSearchParams('library=stolen&approval=&sort=password');
    expect(readPartsView(OP_AMPS, address)).toEqual({ search: '' });
    expect(isNarrowed(OP_AMPS, readPartsView(OP_AMPS, address))).toBe(false);
  });

  it('is read by the kind of part that the list holds', () => {
    const address = new URLSearchParams(
      'inputType=jfet&technology=thin-film,wood&resistanceFrom=4700&resistanceTo=10000&sort=noiseIndex',
    );
    expect(readPartsView(OP_AMPS, address)).toEqual({ search: '', inputType: ['jfet'] });
    expect(readPartsView(RESISTORS, address)).toEqual({
      search: '',
      technology: ['thin-film'],
      resistanceFrom: 4700,
      resistanceTo: 10_000,
      sort: 'noiseIndex',
    });
  });

  it.each(['', 'much', '-5', '0', 'Infinity'])('opens the window of values at “%s”', (value) => {
    const view = readPartsView(RESISTORS, new URLSearchParams({ resistanceFrom: value }));
    expect(view).toEqual({ search: '' });
  });

  it('counts as narrowed by a window that is open at one end', () => {
    expect(isNarrowed(RESISTORS, { search: '', resistanceTo: 100 })).toBe(true);
  });
});

describe('the facts of the list', () => {
  const curated = opAmp({ library: 'curated' });
  const unknown = opAmp({ amplifier: { ...opAmp().amplifier, currentNoise: null } });
  const list = { isPending: false, error: null, retry: () => undefined };

  it('count the libraries and the gaps', () => {
    const shown = { ...list, parts: [curated, unknown], total: 2, matching: 2, isComplete: true };
    expect(partsFacts(OP_AMPS, shown, false)).toBe(
      '2 parts: 1 curated, 1 of your own; 1 without current noise',
    );
  });

  it('name the gap that matters for the kind of part', () => {
    const silent = resistor({ resistor: { ...resistor().resistor, noiseIndex: null } });
    const shown = { ...list, parts: [silent], total: 1, matching: 1, isComplete: true };
    expect(partsFacts(RESISTORS, shown, false)).toBe(
      '1 part: 0 curated, 1 of your own; 1 without noise index',
    );
  });

  it('say that the list goes on', () => {
    const shown = { ...list, parts: [curated], total: 100_243, matching: 100_243, isComplete: false };
    expect(partsFacts(OP_AMPS, shown, false)).toBe(
      '100\u2009243 parts, of which the first 1 are shown: search or narrow for the others',
    );
  });

  it('say how many were found', () => {
    const shown = { ...list, parts: [curated], total: 283, matching: 1, isComplete: true };
    expect(partsFacts(OP_AMPS, shown, true)).toBe('1 part found among 283 parts');
    const first = { ...shown, total: 2311, matching: 1148, isComplete: false };
    expect(partsFacts(OP_AMPS, first, true)).toBe(
      '1\u2009148 parts found among 2\u2009311 parts, of which the first 1 are shown',
    );
  });
});
