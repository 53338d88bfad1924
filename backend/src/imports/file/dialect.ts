import type { DecimalMark } from '@roothertz/common/imports';
import type { Delimiter, Encoding } from '../../shared/csv/csv-format.js';

/** How an uploaded list is written. */
export interface Dialect {
  encoding: Encoding;
  byteOrderMark: boolean;
  delimiter: Delimiter;
  decimalMark: DecimalMark;
  /** The line on which the headings stand, from 1. */
  headerLine: number;
}

/** What a member overrules of the detected dialect. */
export type DialectChoice = Partial<Omit<Dialect, 'byteOrderMark'>>;
