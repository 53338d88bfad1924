import type { TextField } from '@roothertz/common/parts';

/** The name of saved conditions. */
export const CONDITIONS_NAME = {
  key: 'name',
  label: 'name',
  required: true,
  maxLength: 120,
  fallback: null,
  synonyms: [],
} as const satisfies TextField;

/** The most parts that are chosen at saved conditions. */
export const MOST_PARTS = 20;
