import type { DecimalMark } from '@roothertz/common/imports';

export const ENCODINGS = ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'] as const;
export type Encoding = (typeof ENCODINGS)[number];

export const DELIMITERS = ['comma', 'semicolon', 'tab', 'pipe'] as const;
export type Delimiter = (typeof DELIMITERS)[number];

export const DELIMITER_CHARACTERS: Record<Delimiter, string> = {
  comma: ',',
  semicolon: ';',
  tab: '\t',
  pipe: '|',
};

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
