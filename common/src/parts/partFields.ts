import type { Gap } from './parameter.js';
import { TECHNOLOGIES } from './technology.js';
import { APPROVALS, INPUT_TYPES, LIFECYCLES } from './vocabulary.js';

/** A field of text, or a choice of words, that a part has beside its numeric parameters. */
export interface TextField {
  key: string;
  label: string;
  required?: boolean;
  maxLength: number;
  options?: readonly string[];
  fallback: string | null;
  synonyms: readonly string[];
}

/** A choice of words that may be unknown. */
export interface ChoiceField extends TextField {
  options: readonly string[];
  fallback: null;
  gap: Gap;
}

/** What every part has, whatever its kind. */
export const PART_FIELDS = [
  {
    key: 'manufacturer',
    label: 'manufacturer',
    required: true,
    maxLength: 120,
    fallback: null,
    synonyms: ['maker', 'mfr', 'brand', 'Hersteller', 'fabricant'],
  },
  {
    key: 'partNumber',
    label: 'part number',
    required: true,
    maxLength: 120,
    fallback: null,
    synonyms: ['part', 'mpn', 'type', 'order code', 'Bestellnr.', 'Bestellnummer', 'Typ', 'référence'],
  },
  {
    key: 'description',
    label: 'description',
    maxLength: 1000,
    fallback: '',
    synonyms: ['remark', 'Beschreibung', 'Bezeichnung', 'désignation'],
  },
  {
    key: 'package',
    label: 'package',
    maxLength: 60,
    fallback: '',
    synonyms: ['case', 'housing', 'Gehäuse', 'boîtier'],
  },
  {
    key: 'lifecycle',
    label: 'lifecycle',
    maxLength: 20,
    options: LIFECYCLES,
    fallback: 'active',
    synonyms: ['status', 'life cycle', 'Lebenszyklus', 'cycle de vie'],
  },
  {
    key: 'approval',
    label: 'approval',
    maxLength: 20,
    options: APPROVALS,
    fallback: 'approved',
    synonyms: ['released', 'Freigabe', 'homologation'],
  },
] as const satisfies readonly TextField[];

export type PartFieldKey = (typeof PART_FIELDS)[number]['key'];

/** The choice of words in an op-amp's parameters. */
export const INPUT_TYPE_FIELD = {
  key: 'inputType',
  label: 'input type',
  maxLength: 20,
  options: INPUT_TYPES,
  fallback: null,
  gap: {
    weight: 2,
    meaning:
      'The current noise isn’t carried to another temperature, and nothing bounds an unknown one from below.',
  },
  synonyms: ['input', 'technology', 'Eingang', 'Technologie', 'entrée'],
} as const satisfies ChoiceField;

/** The choice of words in a resistor's parameters. */
export const TECHNOLOGY_FIELD = {
  key: 'technology',
  label: 'technology',
  maxLength: 20,
  options: TECHNOLOGIES,
  fallback: null,
  gap: { weight: 2, meaning: 'A ranking narrowed by technology leaves the part out.' },
  synonyms: ['resistor technology', 'construction', 'element', 'Technologie', 'Bauart', 'fabrication'],
} as const satisfies ChoiceField;
