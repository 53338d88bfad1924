import { OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readPartList, readSeriesList } from './part-list.js';

describe('a list of parts in data/', () => {
  const folder = mkdtempSync(join(tmpdir(), 'part-list-'));
  const listOf = (...rows: string[]) => {
    const path = join(folder, 'list.csv');
    writeFileSync(path, ['\uFEFFmanufacturer,part number,voltage noise [nV/√Hz]', ...rows].join('\r\n'));
    return path;
  };
  afterAll(() => rmSync(folder, { recursive: true }));

  it('is read into SI units, quoted cells and empty lines included', () => {
    const parts = readPartList(OP_AMP_CATALOGUE, listOf('"Kestrel, Analog",KA-1,1.1', '', 'Kestrel,KA-2,2'));
    expect(parts.map(({ manufacturer }) => manufacturer)).toEqual(['Kestrel, Analog', 'Kestrel']);
    expect(parts.map(({ amplifier }) => amplifier.voltageNoise)).toEqual([1.1e-9, 2e-9]);
  });

  it('is refused at its first fault, naming line and field', () => {
    const list = listOf('Kestrel,KA-1,1.1', '', 'Kestrel,KA-2,loud', ',KA-3,3');
    expect(() => readPartList(OP_AMP_CATALOGUE, list)).toThrow(
      /list\.csv, line 4, amplifier\.voltageNoise: voltage noise/,
    );
  });

  it('of series is refused in the same way', () => {
    expect(() => readSeriesList(listOf('Kestrel,KR-1,1'))).toThrow(
      /list\.csv, line 2, resistor\.resistance: resistance: the list needs this column/,
    );
  });
});
