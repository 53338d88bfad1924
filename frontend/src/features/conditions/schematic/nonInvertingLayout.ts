import type { Branch, DiscPlace, ElementPlace, SchematicLayout, ValuePlace } from './layout';

const WIRES = 'M20 154V128M20 104V66H34M70 66H85M115 66H226M284 84H302M226 102H212';

const BRANCHES: readonly Branch[] = [
  { field: 'conditions.source.capacitance', path: 'M130 66V88M130 93V112' },
  { field: 'conditions.stage.loadResistance', path: 'M178 66V80M178 110V118' },
];

const ELEMENTS: readonly ElementPlace[] = [
  { symbol: 'voltageSource', x: 20, y: 116 },
  { symbol: 'ground', x: 20, y: 154 },
  { symbol: 'coil', x: 52, y: 66, inLine: true, field: 'conditions.source.inductance' },
  { symbol: 'resistor', x: 100, y: 66, inLine: true, field: 'conditions.source.resistance' },
  { symbol: 'node', x: 130, y: 66, field: 'conditions.source.capacitance' },
  { symbol: 'capacitor', x: 130, y: 90.5, vertical: true, field: 'conditions.source.capacitance' },
  { symbol: 'ground', x: 130, y: 112, field: 'conditions.source.capacitance' },
  { symbol: 'node', x: 178, y: 66, field: 'conditions.stage.loadResistance' },
  { symbol: 'resistor', x: 178, y: 95, vertical: true, field: 'conditions.stage.loadResistance' },
  { symbol: 'ground', x: 178, y: 118, field: 'conditions.stage.loadResistance' },
  { symbol: 'plusInput', x: 235, y: 66 },
  { symbol: 'minusInput', x: 235, y: 102 },
  { symbol: 'node', x: 296, y: 84 },
  { symbol: 'terminal', x: 304, y: 84 },
];

const VALUES: readonly ValuePlace[] = [
  { field: 'conditions.source.inductance', x: 50, y: 32 },
  { field: 'conditions.source.resistance', x: 104, y: 32 },
  { field: 'conditions.source.capacitance', x: 126, y: 134 },
  { field: 'conditions.stage.loadResistance', x: 178, y: 140, emptyText: 'none' },
  {
    field: 'conditions.source.temperature',
    x: 2,
    y: 184,
    align: 'left',
    before: 'source at',
    emptyText: 'ambient',
  },
];

const DISCS: readonly DiscPlace[] = [
  { contributor: 'source', x: 100, y: 66, label: { x: 94, y: 104, anchor: 'middle' } },
  { contributor: 'bias', x: 178, y: 95, label: { x: 168, y: 112, anchor: 'end' } },
  { contributor: 'amplifierVoltage', x: 226, y: 66, label: { x: 252, y: 34, anchor: 'middle' } },
  { contributor: 'amplifierCurrentSource', x: 202, y: 66, label: { x: 196, y: 34, anchor: 'middle' } },
];

export const FOLLOWER_LAYOUT: SchematicLayout = {
  height: 200,
  wires: `${WIRES}V140H296V84`,
  branches: BRANCHES,
  amplifiers: [{ x: 226, y: 84 }],
  elements: ELEMENTS,
  values: VALUES,
  discs: DISCS,
};

export const NON_INVERTING_LAYOUT: SchematicLayout = {
  height: 254,
  wires: `${WIRES}V194M212 172H240M270 172H296V84M212 224V234`,
  branches: BRANCHES,
  amplifiers: [{ x: 226, y: 84 }],
  elements: [
    ...ELEMENTS,
    { symbol: 'node', x: 212, y: 172 },
    { symbol: 'resistor', x: 255, y: 172 },
    { symbol: 'resistor', x: 212, y: 209, vertical: true, field: 'conditions.stage.gainResistance' },
    { symbol: 'ground', x: 212, y: 234 },
  ],
  values: [
    ...VALUES,
    { field: 'conditions.stage.gain', x: 262, y: 195, before: 'gain' },
    { field: 'conditions.stage.gainResistance', x: 186, y: 209, align: 'right' },
  ],
  discs: [
    ...DISCS,
    { contributor: 'amplifierCurrentFeedback', x: 212, y: 102, label: { x: 206, y: 166, anchor: 'end' } },
    { contributor: 'feedback', x: 212, y: 209, label: { x: 236, y: 224, anchor: 'start' } },
  ],
  feedbackResistances: [{ x: 255, y: 156 }],
};
