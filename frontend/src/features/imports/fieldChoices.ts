import { type ColumnMapping, NOISE_FORMS } from '@roothertz/common/imports';
import { type ListedFields, PART_FIELDS } from '@roothertz/common/parts';
import { type QuantityKind, QUANTITIES, parseUnit } from '@roothertz/common/units';
import type { FieldChoice, FieldChoices } from './listView';

/** Everything that a column of a list of parts can become, in groups. */
export function fieldChoices({ choice, parameters }: ListedFields): FieldChoices {
  const texts = [...PART_FIELDS, choice].map(({ key, label }) => choiceOf('value', key, label));
  const figures = parameters.flatMap(({ key, label }) => [
    choiceOf('value', key, label),
    ...noiseForms(key, label),
  ]);
  const origins = parameters.map(({ key, label }) => choiceOf('origin', key, `${label}, origin`));
  return [
    { value: '' as const, label: 'left out' },
    { label: 'Part', options: texts },
    { label: 'Figures', options: figures },
    { label: 'Where a figure comes from', options: origins },
  ];
}

function noiseForms(key: string, label: string): FieldChoice[] {
  const forms = NOISE_FORMS[key];
  if (forms === undefined) return [];
  const spot = choiceOf('spot', key, `${label} at a frequency`);
  return forms.peakToPeak
    ? [spot, choiceOf('peak-to-peak', key, `${label}, 0.1–10 Hz peak to peak`)]
    : [spot];
}

function choiceOf(
  form: 'value' | 'origin' | 'spot' | 'peak-to-peak',
  key: string,
  label: string,
): FieldChoice {
  return { value: `${form}:${key}`, label };
}

const PREFIXES_OF: Partial<Record<QuantityKind, readonly string[]>> = {
  resistance: ['m', '', 'k', 'M'],
  capacitance: ['f', 'p', 'n', 'µ'],
  frequency: ['', 'k', 'M', 'G'],
  voltage: ['n', 'µ', 'm', ''],
  current: ['f', 'p', 'n', 'µ', 'm', ''],
  voltageNoiseDensity: ['p', 'n', 'µ', ''],
  currentNoiseDensity: ['f', 'p', 'n', ''],
  power: ['µ', 'm', ''],
};

const OTHER_UNITS: Partial<Record<QuantityKind, readonly string[]>> = {
  fraction: ['%', 'ppm'],
  temperatureCoefficient: ['ppm/K', '%/K'],
  temperatureDifference: ['K'],
  decibel: ['dB'],
};

/** The units that a column of a kind may be in; the one of the file is among them, however it is spelt. */
function unitChoices(kind: QuantityKind, present: string | null): { value: string; label: string }[] {
  const usual = PREFIXES_OF[kind]?.map((prefix) => prefix + QUANTITIES[kind].unit) ?? OTHER_UNITS[kind] ?? [];
  const spelt = present !== null && !usual.includes(present) && parseUnit(present, kind) ? [present] : [];
  return [...spelt, ...usual].map((unit) => ({ value: unit, label: unit }));
}

/** The units that a column of a list of parts may be in. */
export function partUnits({ parameters }: ListedFields, { field, form, unit }: ColumnMapping) {
  const parameter = parameters.find(({ key }) => key === field);
  if (parameter === undefined || form === 'origin') return [];
  return unitChoices(form === 'peak-to-peak' ? 'voltage' : parameter.kind, unit);
}
