import { RESISTOR_CONDITION_FIELDS } from '@roothertz/common/conditions';
import { STAGE_SEARCH_FIELDS } from '@roothertz/common/noise';
import type { QuantityField } from '@roothertz/common/parts';

/** What the middle of the page ranks. */
export const VIEWS = ['op-amps', 'stages', 'resistors'] as const;
export type View = (typeof VIEWS)[number];
export const VIEW_KEY = 'view';

/** A numeric field that the address holds beside the operating conditions. */
export interface SearchField {
  field: QuantityField;
  /** The field's path in the request. */
  path: string;
  /** What holds where the address says nothing. */
  usual: number;
}

const stageField = (path: keyof typeof STAGE_SEARCH_FIELDS, usual: number): SearchField => ({
  field: STAGE_SEARCH_FIELDS[path],
  path,
  usual,
});
const placeField = (path: keyof typeof RESISTOR_CONDITION_FIELDS, usual: number): SearchField => ({
  field: RESISTOR_CONDITION_FIELDS[path],
  path,
  usual,
});

/** What a search for whole stages asks beside the conditions, by its key in the address. */
export const STAGE_SEARCH_KEYS = {
  gtol: stageField('conditions.stage.gainTolerance', 0.01),
  nmax: stageField('conditions.stage.network.maximumTotal', 100e3),
  par: stageField('conditions.stage.parallelMaximum', 1),
  within: stageField('within', 1),
};

/** The place of a resistor; band and temperature are those of the conditions. */
export const PLACE_KEYS = {
  r: placeField('conditions.resistance', 1000),
  rtol: placeField('conditions.resistanceTolerance', 0.02),
  vr: placeField('conditions.dcVoltage', 0),
};

/** What whole stages are sorted by, where it isn't the noise. */
export const SORT_KEY = 'by';
/** The technologies of resistors that count; all where none is named. */
export const TECHNOLOGY_KEY = 'tech';
/** The widest tolerance of resistors that count; any where none is named. */
export const TOLERANCE_KEY = 'tol';
/** What was wanted of a network that has been taken into the schematic since, where it doesn't give just that. */
export const WANTED_KEY = 'want';

/** What stays in the address when the conditions change. */
export const SEARCH_KEYS: readonly string[] = [
  VIEW_KEY,
  SORT_KEY,
  TECHNOLOGY_KEY,
  TOLERANCE_KEY,
  ...Object.keys(STAGE_SEARCH_KEYS),
  ...Object.keys(PLACE_KEYS),
];
