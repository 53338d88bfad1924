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
