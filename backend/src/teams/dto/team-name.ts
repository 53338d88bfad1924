import type { TextField } from '@roothertz/common/parts';

/** The name of a team. */
export const TEAM_NAME = {
  key: 'name',
  label: 'name',
  required: true,
  maxLength: 120,
  fallback: null,
  synonyms: [],
} as const satisfies TextField;
