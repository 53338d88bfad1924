import type { Origin } from '../parts/index.js';

/**
 * How a column states its field: the value itself, where the value comes from, a noise density at one
 * frequency, the peak-to-peak noise from 0.1 to 10 Hz, or a unit price from a quantity on.
 */
export const COLUMN_FORMS = ['value', 'origin', 'spot', 'peak-to-peak', 'break'] as const;
export type ColumnForm = (typeof COLUMN_FORMS)[number];

/** What a column of an uploaded list becomes; a column without a mapping is left out. */
export interface ColumnMapping {
  /** The column's place, from 0. */
  column: number;
  /** Key of a field or parameter of the kind of list. */
  field: string;
  form: ColumnForm;
  /** The unit of figures whose cells state none, of prices their currency; null for words and origins. */
  unit: string | null;
  /** Hz, of a noise density at one frequency. */
  frequency: number | null;
  /** Pieces, of a unit price from a quantity on. */
  quantity: number | null;
  /** Where the figures of the whole column come from, such as `maximum` under “en max”. */
  origin: Origin | null;
}

/** The parameters that may be stated in the forms of a data sheet, each with its 1/f corner. */
export const NOISE_FORMS: Readonly<Record<string, { corner: string; peakToPeak: boolean }>> = {
  voltageNoise: { corner: 'voltageNoiseCorner', peakToPeak: true },
  currentNoise: { corner: 'currentNoiseCorner', peakToPeak: false },
};
