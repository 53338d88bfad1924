import { describe, expect, it } from 'vitest';
import { opAmp } from '../../test/factories';
import { createPartsSearch, joinFound } from './searchParts';

const VIREO = opAmp({ id: '1', manufacturer: 'Vireo', partNumber: 'VR-1108', description: 'geophone stage' });
const TARN = opAmp({ id: '2', manufacturer: 'Tarn Micro', partNumber: 'TN-610' });
const OTHER = opAmp({ id: '3', manufacturer: 'Vireo', partNumber: 'VR-1144' });
const search = createPartsSearch([TARN, OTHER, VIREO]);

function found(text: string): string[] {
  return search(text).map(({ partNumber }) => partNumber);
}

describe('searching the loaded parts', () => {
  it('finds a number without its punctuation', () => {
    expect(found('vr1108')).toContain('VR-1108');
  });

  it('narrows with every word, whichever field it stands in', () => {
    expect(found('vireo 1108')).toEqual(['VR-1108']);
    expect(found('geophone')).toEqual(['VR-1108']);
  });

  it('gives all of them, in their order, where nothing is searched for', () => {
    expect(found('  ')).toEqual(['TN-610', 'VR-1144', 'VR-1108']);
  });

  it('finds nothing where nothing is alike', () => {
    expect(found('zzzz')).toEqual([]);
  });

  it('adds what only the server found, once each', () => {
    expect(joinFound([VIREO], [TARN, VIREO])).toEqual([VIREO, TARN]);
  });
});
