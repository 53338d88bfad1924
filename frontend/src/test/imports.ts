import type { Import, ImportRow } from '../api/imports';

/** A checked list of two op-amps, one of which is refused. */
export function importOf(changes: Partial<Import> = {}): Import {
  const proposal = { confidence: 1, unitAssumed: false, form: 'value' as const };
  const columns: Import['columns'] = [
    { field: 'manufacturer', heading: 'Hersteller', samples: ['Vireo'] },
    { field: 'partNumber', heading: 'Bestellnr.', samples: ['VR-1108'] },
    { field: 'voltageNoise', heading: 'en', samples: ['1,15'], unit: 'nV/√Hz' },
    { field: null, heading: 'Bauform', samples: ['SOIC-8'] },
  ].map(({ field, unit = null, heading, samples }, column) => ({
    column,
    heading,
    samples,
    proposed:
      field === null
        ? null
        : { ...proposal, column, field, unit, frequency: null, quantity: null, origin: null },
  }));
  return {
    id: '5',
    kind: 'op-amps',
    state: 'checked',
    fileName: 'op-amp-liste.csv',
    fileSize: 90,
    rowCount: 2,
    counts: { new: 0, changed: 1, unchanged: 0, doubtful: 0, refused: 1 },
    keptCount: 0,
    progress: null,
    failure: null,
    createdAt: '2026-12-01T09:41:00.000Z',
    createdBy: { id: '7', name: 'Ada Merrow' },
    appliedAt: null,
    appliedBy: null,
    undoneAt: null,
    undoneBy: null,
    dialect: {
      encoding: 'windows-1252',
      byteOrderMark: false,
      delimiter: 'semicolon',
      decimalMark: 'comma',
      headerLine: 3,
    },
    columns,
    mapping: columns.flatMap(({ proposed }) => {
      if (proposed === null) return [];
      const { confidence: _confidence, unitAssumed: _unitAssumed, ...mapped } = proposed;
      return [mapped];
    }),
    wholeList: { supplier: null, currency: null },
    version: 1,
    rememberedMapping: null,
    sameFile: null,
    ...changes,
  };
}

export const CHANGED_ROW: ImportRow = {
  line: 4,
  state: 'changed',
  manufacturer: 'Vireo',
  partNumber: 'VR-1108',
  supplier: null,
  changes: [{ field: 'amplifier.voltageNoise', old: 1.1e-9, new: 1.15e-9 }],
  doubts: [],
  errors: [],
  kept: false,
};

export const REFUSED_ROW: ImportRow = {
  ...CHANGED_ROW,
  line: 5,
  state: 'refused',
  manufacturer: '',
  partNumber: '',
  changes: [],
  errors: [{ column: 'en', value: 'n.a.', why: 'a number was expected', expected: 'such as 3.3 nV/√Hz' }],
};

/** A price list that isn't checked yet, without columns for supplier and currency. */
export function pricesOf(changes: Partial<Import> = {}): Import {
  const proposal = { confidence: 1, unitAssumed: false, unit: null, frequency: null, origin: null };
  const columns: Import['columns'] = [
    { field: 'manufacturer', heading: 'Hersteller' },
    { field: 'partNumber', heading: 'Typ' },
    { field: 'unitPrice', heading: 'ab 100', quantity: 100 },
    { field: null, heading: 'Lagerort' },
  ].map(({ field, heading, quantity = null }, column) => ({
    column,
    heading,
    samples: ['1'],
    proposed:
      field === null
        ? null
        : { ...proposal, column, field, quantity, form: quantity === null ? 'value' : ('break' as const) },
  }));
  return importOf({
    id: '6',
    kind: 'prices',
    fileName: 'angebot.csv',
    state: 'uploaded',
    columns,
    mapping: null,
    counts: null,
    ...changes,
  });
}

export const PRICE_ROW: ImportRow = {
  ...CHANGED_ROW,
  supplier: 'Larkholm Components',
  changes: [{ field: 'breaks.100', old: '3.1000', new: '2.9500' }],
};
