import { describe, expect, it } from 'vitest';
import { conditionsWith } from '../../test/support/stages.js';
import type { Complex } from '../numeric/index.js';
import { groupAmplifiers } from './amplifierGroups.js';
import { stageModel } from './stage/stageModel.js';

/** Both poles of a pair at a frequency in Hz. */
function pair(frequency: number, quality: number): Complex[] {
  const angular = 2 * Math.PI * frequency;
  const re = -angular / (2 * quality);
  const im = Math.sqrt(angular * angular - re * re);
  return [
    { re, im },
    { re, im: -im },
  ];
}

/** Groups parts with the given poles, row by row, and says how many nodes each group's sum has. */
function groupsOf(polesByRow: readonly Complex[][], qualities: readonly number[]) {
  const counts: number[] = [];
  const conditions = conditionsWith({ source: { inductance: 1 } });
  const model = {
    ...stageModel(conditions),
    quality: (row: number) => qualities[row],
    poles: (row: number) => polesByRow[row],
    compile(nodes: { count: number }) {
      counts.push(nodes.count);
      return () => undefined;
    },
  };
  const rows = polesByRow.map((_, row) => row);
  const columns = { gainBandwidth: rows, inputCapacitance: rows.map(() => 0) };
  const groups = groupAmplifiers(conditions, model, columns);
  return { rows: groups.map((group) => group.rows), counts };
}

describe('groupAmplifiers', () => {
  it('gives parts whose resonances are neighbours the same nodes', () => {
    const { rows } = groupsOf([pair(1000, 100), pair(1001, 100), pair(5000, 100)], [100, 100, 100]);
    expect(rows).toEqual([[0, 1], [2]]);
  });

  it('keeps parts without a resonance together, whatever their poles', () => {
    const { rows } = groupsOf([pair(100, 0.5), pair(1e6, 0.5), pair(3000, 100)], [0.5, 0.5, 100]);
    expect(rows).toEqual([[0, 1], [2]]);
  });

  it('parts those that share one resonance by their second one', () => {
    const second = [2e3, 2.0001e3, 15e3];
    const { rows } = groupsOf(
      second.map((frequency) => [...pair(500, 2000), ...pair(frequency, 1000)]),
      [2000, 2000, 2000],
    );
    expect(rows).toEqual([[0, 1], [2]]);
  });

  it('never makes nodes without end for sharp resonances far apart', () => {
    const polesByRow = Array.from({ length: 20 }, (_, k) => [
      ...pair(500, 1e9),
      ...pair(1000 * 1.15 ** k, k % 2 === 0 ? 3 : 1e8),
    ]);
    const { rows, counts } = groupsOf(
      polesByRow,
      polesByRow.map(() => 1e9),
    );
    expect(rows.flat().sort((a, b) => a - b)).toEqual(polesByRow.map((_, row) => row));
    expect(Math.max(...counts)).toBeLessThan(3000);
  });
});
