import { describe, expect, it } from 'vitest';
import { checkConditions } from '../../src/conditions/index.js';
import {
  APPROVALS,
  LIFECYCLES,
  normalisePartKey,
  OP_AMP_CATALOGUE,
  ORIGINS,
  type OpAmpParameterKey,
  type OpAmpPart,
} from '../../src/parts/index.js';
import { readOpAmps, readRows } from './readCsv.js';
import { tarnfield } from './tarnfield.js';

const PATH = 'demo/tarnfield-op-amps.csv';
const parts = readOpAmps(PATH);
const curated = readOpAmps('curated/op-amps.csv');
const keyOf = ({ manufacturer, partNumber }: OpAmpPart) => normalisePartKey(manufacturer, partNumber);

describe('Tarnfield’s own list', () => {
  it('reads without an error in any row', () => {
    expect(readRows(OP_AMP_CATALOGUE, PATH).filter(({ ok }) => !ok)).toEqual([]);
  });

  it('has at least 60 op-amps, none twice', () => {
    expect(parts.length).toBeGreaterThanOrEqual(60);
    expect(new Set(parts.map(keyOf))).toHaveProperty('size', parts.length);
  });

  it('records some of the curated parts anew, and most parts that aren’t among them', () => {
    const known = new Set(curated.map(keyOf));
    const overlap = parts.filter((part) => known.has(keyOf(part))).length;
    expect(overlap).toBeGreaterThanOrEqual(10);
    expect(overlap).toBeLessThan(parts.length / 2);
  });

  it.each<[OpAmpParameterKey, number]>([
    ['currentNoise', 8],
    ['voltageNoiseCorner', 10],
    ['gainBandwidth', 3],
    ['inputBiasCurrent', 3],
    ['inputCapacitance', 10],
  ])('doesn’t know %s of at least %i parts', (key, least) => {
    expect(parts.filter(({ amplifier }) => amplifier[key] === null).length).toBeGreaterThanOrEqual(least);
  });

  it('holds every lifecycle, every approval and figures of every origin', () => {
    expect(new Set(parts.map(({ lifecycle }) => lifecycle))).toEqual(new Set(LIFECYCLES));
    expect(new Set(parts.map(({ approval }) => approval))).toEqual(new Set(APPROVALS));
    const origins = new Set(parts.map((part) => part.origins.voltageNoise ?? 'typical'));
    expect(origins).toEqual(new Set(ORIGINS));
  });
});

describe('Tarnfield’s accounts', () => {
  it('give each role to one member', () => {
    const roles = ['admin', 'librarian', 'purchasing', 'engineer', 'reviewer'];
    expect(tarnfield.members.map((member) => member.roles)).toEqual(roles.map((role) => [role]));
    expect(tarnfield.members.map(({ email }) => email)).toEqual(
      roles.map((role) => `${role}@tarnfield.example`),
    );
  });
});

describe('Tarnfield’s operating conditions', () => {
  it('are six, each under its own name', () => {
    expect(new Set(tarnfield.conditions.map(({ name }) => name))).toHaveProperty('size', 6);
  });

  it.each(tarnfield.conditions.map(({ name, ranking }) => [name, ranking] as const))(
    'those of “%s” are free of errors and choose among active, approved parts',
    (_name, ranking) => {
      expect(checkConditions(ranking)).toEqual([]);
      expect(ranking.filter).toMatchObject({
        library: ['curated', 'team'],
        lifecycle: ['active'],
        approval: ['approved'],
      });
    },
  );
});
