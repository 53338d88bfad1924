import type { ElementPlace, SchematicLayout } from './layout';

/** What each leg of the source meets, as far as it is alike. */
const LEGS: readonly ElementPlace[] = [44, 236].flatMap((y): ElementPlace[] => [
  { symbol: 'coil', x: 46, y, inLine: true, field: 'conditions.source.inductance' },
  { symbol: 'resistor', x: 85, y, inLine: true, field: 'conditions.source.resistance' },
  { symbol: 'node', x: 110, y, field: 'conditions.source.capacitance' },
  { symbol: 'node', x: 134, y, field: 'conditions.stage.loadResistance' },
]);

/** From the outputs of the input pair on. */
const DIFFERENCE: readonly ElementPlace[] = [56, 224].flatMap((y): ElementPlace[] => [
  { symbol: 'node', x: 204, y },
  { symbol: 'resistor', x: 231, y },
  { symbol: 'node', x: 253, y },
  { symbol: 'resistor', x: 275, y },
]);

const NETWORK: readonly ElementPlace[] = [
  { symbol: 'resistor', x: 204, y: 88, vertical: true },
  { symbol: 'node', x: 204, y: 112 },
  { symbol: 'resistor', x: 204, y: 140, vertical: true, field: 'conditions.stage.gainResistance' },
  { symbol: 'node', x: 204, y: 168 },
  { symbol: 'resistor', x: 204, y: 192, vertical: true },
];

export const INSTRUMENTATION_LAYOUT: SchematicLayout = {
  height: 298,
  wires:
    'M20 128V44H28M64 44H70M100 44H160M20 152V236H28M64 236H70M100 236H160' +
    'M196 56H216M204 56V73M204 103V112M204 168V177M204 207V224M196 224H216' +
    'M204 112H152V68H160M204 168H152V212H160' +
    'M246 56H260M290 56H298V140M253 56V128H262M246 224H260M290 224H298V234M253 224V152H262M298 140H302',
  branches: [
    { field: 'conditions.source.capacitance', path: 'M110 44V137.5M110 142.5V236' },
    { field: 'conditions.stage.loadResistance', path: 'M134 44V65M134 95V185M134 215V236M134 126H160' },
    { field: 'conditions.stage.gainResistance', path: 'M204 112V125M204 155V168' },
  ],
  amplifiers: [
    { x: 160, y: 56, small: true },
    { x: 160, y: 224, small: true },
    { x: 262, y: 140, small: true },
  ],
  elements: [
    ...LEGS,
    ...NETWORK,
    ...DIFFERENCE,
    { symbol: 'voltageSource', x: 20, y: 140 },
    { symbol: 'capacitor', x: 110, y: 140, vertical: true, field: 'conditions.source.capacitance' },
    { symbol: 'resistor', x: 134, y: 80, vertical: true, field: 'conditions.stage.loadResistance' },
    { symbol: 'resistor', x: 134, y: 200, vertical: true, field: 'conditions.stage.loadResistance' },
    { symbol: 'node', x: 134, y: 126, field: 'conditions.stage.loadResistance' },
    { symbol: 'ground', x: 160, y: 126, field: 'conditions.stage.loadResistance' },
    { symbol: 'ground', x: 298, y: 234 },
    { symbol: 'plusInput', x: 168, y: 44 },
    { symbol: 'minusInput', x: 168, y: 68 },
    { symbol: 'minusInput', x: 168, y: 212 },
    { symbol: 'plusInput', x: 168, y: 236 },
    { symbol: 'minusInput', x: 270, y: 128 },
    { symbol: 'plusInput', x: 270, y: 152 },
    { symbol: 'node', x: 298, y: 140 },
    { symbol: 'terminal', x: 304, y: 140 },
  ],
  values: [
    { field: 'conditions.source.inductance', x: 40, y: 14 },
    { field: 'conditions.source.resistance', x: 90, y: 14 },
    { field: 'conditions.source.capacitance', x: 102, y: 140, align: 'right' },
    { field: 'conditions.stage.loadResistance', x: 164, y: 148, emptyText: 'none' },
    { field: 'conditions.stage.gainResistance', x: 212, y: 140, align: 'left' },
    {
      field: 'conditions.stage.differenceResistance',
      x: 304,
      y: 34,
      align: 'right',
      before: '4 ×',
      emptyText: '10 kΩ',
    },
    { field: 'conditions.stage.gain', x: 304, y: 190, align: 'right', before: 'gain' },
    {
      field: 'conditions.source.temperature',
      x: 2,
      y: 282,
      align: 'left',
      before: 'source, half of it in each leg, at',
      emptyText: 'ambient',
    },
  ],
  discs: [
    { contributor: 'source', x: 85, y: 44, label: { x: 76, y: 76, anchor: 'middle' } },
    { contributor: 'bias', x: 134, y: 200, label: { x: 104, y: 204, anchor: 'end' } },
    { contributor: 'amplifierCurrentSource', x: 146, y: 44, label: { x: 140, y: 18, anchor: 'middle' } },
    { contributor: 'amplifierVoltage', x: 160, y: 236, label: { x: 164, y: 262, anchor: 'middle' } },
    { contributor: 'amplifierCurrentFeedback', x: 152, y: 212, label: { x: 176, y: 190, anchor: 'middle' } },
    { contributor: 'feedback', x: 204, y: 140, label: { x: 214, y: 166, anchor: 'start' } },
  ],
  feedbackResistances: [{ x: 176, y: 94 }],
};
