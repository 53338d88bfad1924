import type { ElementPlace, SchematicLayout } from './layout';

/** The legs of the source, each with half of its resistance and inductance. */
const LEGS: readonly ElementPlace[] = [84, 164].flatMap((y): ElementPlace[] => [
  { symbol: 'coil', x: 46, y, inLine: true, field: 'conditions.source.inductance' },
  { symbol: 'resistor', x: 93, y, inLine: true, field: 'conditions.source.resistance' },
  { symbol: 'node', x: 124, y, field: 'conditions.source.capacitance' },
  { symbol: 'resistor', x: 154, y, inLine: true, field: 'conditions.stage.gainResistance' },
  { symbol: 'node', x: 188, y },
]);

export const DIFFERENCE_LAYOUT: SchematicLayout = {
  height: 262,
  wires:
    'M20 112V84H28M64 84H78M108 84H139M169 84H188M20 136V164H28M64 164H78M108 164H139M169 164H188' +
    'M188 106V30H232M262 30H296V124M188 106H226M188 164V142H226M188 164V179M188 209V218M284 124H302',
  branches: [{ field: 'conditions.source.capacitance', path: 'M124 84V121.5M124 126.5V164' }],
  amplifiers: [{ x: 226, y: 124 }],
  elements: [
    ...LEGS,
    { symbol: 'voltageSource', x: 20, y: 124 },
    { symbol: 'capacitor', x: 124, y: 124, vertical: true, field: 'conditions.source.capacitance' },
    { symbol: 'resistor', x: 247, y: 30 },
    { symbol: 'resistor', x: 188, y: 194, vertical: true },
    { symbol: 'ground', x: 188, y: 218 },
    { symbol: 'minusInput', x: 235, y: 106 },
    { symbol: 'plusInput', x: 235, y: 142 },
    { symbol: 'node', x: 296, y: 124 },
    { symbol: 'terminal', x: 304, y: 124 },
  ],
  values: [
    { field: 'conditions.source.inductance', x: 42, y: 50 },
    { field: 'conditions.source.resistance', x: 94, y: 50 },
    { field: 'conditions.source.capacitance', x: 114, y: 124, align: 'right' },
    { field: 'conditions.stage.gainResistance', x: 154, y: 50, before: '2 ×' },
    {
      field: 'conditions.source.temperature',
      x: 2,
      y: 246,
      align: 'left',
      before: 'source, half of it in each leg, at',
      emptyText: 'ambient',
    },
    { field: 'conditions.stage.gain', x: 252, y: 54, before: 'gain' },
  ],
  discs: [
    { contributor: 'source', x: 93, y: 84, label: { x: 84, y: 108, anchor: 'middle' } },
    { contributor: 'feedback', x: 154, y: 84, label: { x: 158, y: 126, anchor: 'middle' } },
    { contributor: 'amplifierCurrentFeedback', x: 206, y: 106, label: { x: 210, y: 82, anchor: 'middle' } },
    { contributor: 'amplifierVoltage', x: 226, y: 142, label: { x: 240, y: 182, anchor: 'start' } },
    { contributor: 'amplifierCurrentSource', x: 206, y: 142, label: { x: 200, y: 176, anchor: 'start' } },
  ],
  feedbackResistances: [
    { x: 247, y: 12 },
    { x: 226, y: 200 },
  ],
};
