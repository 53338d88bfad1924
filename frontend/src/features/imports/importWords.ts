import type { Import, ImportState, RowCounts } from '../../api/imports';
import { countOf } from '../../components/countOf';

const STATE_WORDS: Readonly<Record<ImportState, string>> = {
  uploaded: 'not checked yet',
  checking: 'being checked',
  checked: 'checked, not applied',
  waiting: 'waiting for another import',
  applying: 'being applied',
  applied: 'applied',
  undoing: 'being undone',
  undone: 'undone',
  cancelled: 'cancelled',
  interrupted: 'interrupted, run again',
  outdated: 'out of date, check again',
  failed: 'failed',
};

const MAPPABLE: readonly ImportState[] = [
  'uploaded',
  'checked',
  'cancelled',
  'interrupted',
  'outdated',
  'failed',
];

export function stateWords(state: ImportState): string {
  return STATE_WORDS[state];
}

/** Columns and dialect can be changed. */
export function isMappable({ state }: Pick<Import, 'state'>): boolean {
  return MAPPABLE.includes(state);
}

/** Something can be said of columns and dialect: a check that is under way is stopped by that. */
export function isDescribable(imported: Pick<Import, 'state'>): boolean {
  return isMappable(imported) || imported.state === 'checking';
}

/** The rows are checked, and can be written. */
export function isApplicable({ state, counts }: Pick<Import, 'state' | 'counts'>): boolean {
  return counts !== null && MAPPABLE.includes(state) && state !== 'uploaded' && state !== 'outdated';
}

/** How many rows the import writes. */
export function acceptedRows(counts: RowCounts): number {
  return counts.new + counts.changed + counts.doubtful;
}

export function rows(number: number): string {
  return countOf(number, 'row');
}

/** How long the work still takes, roughly. */
export function timeLeft(seconds: number): string {
  if (seconds < 1) return 'nearly done';
  if (seconds < 90) return `about ${Math.ceil(seconds)} s left`;
  return `about ${Math.round(seconds / 60)} min left`;
}
