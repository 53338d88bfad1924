import { it } from 'vitest';
import { rankAmplifiers } from '../../src/noise/index.js';
import { readData, readParts } from './readCsv.js';
import { libraryColumns } from './libraryColumns.js';
it('x', () => {
  const parts = [readParts('curated/op-amps.csv'), readParts('demo/tarnfield-op-amps.csv')];
  const libs = parts.map(libraryColumns);
  for (const { name, ranking: r } of JSON.parse(readData('demo/tarnfield.json')).conditions) {
    const x = rankAmplifiers({ conditions: r.conditions, filter: r.filter, target: r.target ?? {}, sort: 'inputNoiseRms', descending: false, limit: 16, offset: 0 }, libs);
    const ex: any = {}; x.excluded.forEach((e) => (ex[e.reason] = (ex[e.reason] ?? 0) + 1));
    console.log(name, 'total', x.total, 'quiet', x.quietSetTotal, 'floor', x.floor, JSON.stringify(ex));
    for (const i of x.items) {
      const p = parts[i.library][i.row]; const f = i.figures; const T = f.inputNoiseRms;
      console.log(i.quietSet ? '*' : ' ', i.library ? 'T' : 'c', p.partNumber.padEnd(9), p.amplifier.inputType, T.toPrecision(4), f.aboveFloor?.toFixed(2), Object.entries(f.contributions).map(([k, v]) => k + ' ' + (100 * (v / T) ** 2).toFixed(0)).join(', '), i.meetsTarget, 'NF', f.noiseFigure?.toFixed(2), f.cautions.join());
    }
  }
});
