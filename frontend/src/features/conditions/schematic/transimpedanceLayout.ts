import type { SchematicLayout } from './layout';

export const TRANSIMPEDANCE_LAYOUT: SchematicLayout = {
  height: 258,
  wires:
    'M24 200V174M24 150V112H226M78 112V147M78 177V200' +
    'M188 112V36H215M279 36H296V130M188 68H232M262 68H296M284 130H302M226 148H208V166',
  branches: [
    { field: 'conditions.source.capacitance', path: 'M130 112V159M130 164V200' },
    { field: 'conditions.stage.feedbackCapacitance', path: 'M215 36H244.5M249.5 36H279' },
  ],
  amplifiers: [{ x: 226, y: 130 }],
  elements: [
    { symbol: 'currentSource', x: 24, y: 162 },
    { symbol: 'ground', x: 24, y: 200 },
    { symbol: 'node', x: 78, y: 112 },
    { symbol: 'resistor', x: 78, y: 162, vertical: true, field: 'conditions.source.resistance' },
    { symbol: 'ground', x: 78, y: 200 },
    { symbol: 'node', x: 130, y: 112, field: 'conditions.source.capacitance' },
    { symbol: 'capacitor', x: 130, y: 161.5, vertical: true, field: 'conditions.source.capacitance' },
    { symbol: 'ground', x: 130, y: 200, field: 'conditions.source.capacitance' },
    { symbol: 'node', x: 188, y: 112 },
    { symbol: 'node', x: 188, y: 68 },
    { symbol: 'node', x: 296, y: 68 },
    { symbol: 'capacitor', x: 247, y: 36, field: 'conditions.stage.feedbackCapacitance' },
    { symbol: 'resistor', x: 247, y: 68, field: 'conditions.stage.feedbackResistance' },
    { symbol: 'ground', x: 208, y: 166 },
    { symbol: 'minusInput', x: 235, y: 112 },
    { symbol: 'plusInput', x: 235, y: 148 },
    { symbol: 'node', x: 296, y: 130 },
    { symbol: 'terminal', x: 304, y: 130 },
  ],
  values: [
    { field: 'conditions.source.directCurrent', x: 26, y: 221, emptyText: '0 A' },
    { field: 'conditions.source.resistance', x: 80, y: 221 },
    { field: 'conditions.source.capacitance', x: 134, y: 221 },
    {
      field: 'conditions.source.temperature',
      x: 2,
      y: 246,
      align: 'left',
      before: 'source at',
      emptyText: 'ambient',
    },
    { field: 'conditions.stage.feedbackCapacitance', x: 247, y: 14, emptyText: 'auto' },
    { field: 'conditions.stage.feedbackResistance', x: 250, y: 86 },
  ],
  discs: [
    { contributor: 'source', x: 78, y: 162, label: { x: 102, y: 146, anchor: 'start' } },
    { contributor: 'bias', x: 208, y: 156, label: { x: 200, y: 190, anchor: 'end' } },
    { contributor: 'feedback', x: 247, y: 68, label: { x: 228, y: 61, anchor: 'end' } },
    { contributor: 'amplifierCurrentFeedback', x: 204, y: 112, label: { x: 182, y: 104, anchor: 'end' } },
    { contributor: 'amplifierCurrentSource', x: 208, y: 148, label: { x: 200, y: 152, anchor: 'end' } },
    { contributor: 'amplifierVoltage', x: 226, y: 148, label: { x: 240, y: 188, anchor: 'start' } },
  ],
};
