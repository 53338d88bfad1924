import type { ColumnMapping } from '@roothertz/common/imports';
import { ORIGIN_LABELS } from '@roothertz/common/parts';
import type { ImportColumn } from '../../api/imports';
import { becomesOf, type Mapping } from './mappingDraft';

/** A cell that brings its own unit. */
const WITH_UNIT = /\d\s*[^\d\s.,+-]/;

/** How sure the proposal is that still stands, where it isn't quite. */
export function doubtOf({ proposed }: ImportColumn, mapped: ColumnMapping | undefined): string | null {
  if (mapped === undefined || proposed === null || proposed.confidence >= 1) return null;
  const stands = proposed.field === mapped.field && (proposed.form ?? 'value') === mapped.form;
  return stands ? `The heading is only similar: ${Math.round(proposed.confidence * 100)} % sure` : null;
}

/** What is assumed of a column or worked out from it, in words and formulas. */
export function notesOf(column: ImportColumn, mapped: ColumnMapping, mapping: Mapping): string[] {
  const notes = [];
  if (isAssumed(column, mapped)) notes.push(`no unit in the file: ${mapped.unit} assumed`);
  if (mapped.origin !== null) notes.push(ORIGIN_LABELS[mapped.origin]);
  const derived = derivation(mapped, mapping);
  return derived === null ? notes : [...notes, derived];
}

function isAssumed({ proposed, samples }: ImportColumn, mapped: ColumnMapping): boolean {
  return (
    proposed?.unitAssumed === true &&
    !samples.every((cell) => WITH_UNIT.test(cell)) &&
    becomesOf(mapped) === `${proposed.form ?? 'value'}:${proposed.field}` &&
    mapped.unit === (proposed.unit ?? null)
  );
}

function derivation({ column, field, form }: ColumnMapping, mapping: Mapping): string | null {
  const beside = mapping.filter((one) => one.field === field);
  const hasWhite = beside.some((one) => one.form === 'value');
  const spots = beside.filter((one) => one.form === 'spot');
  if (form === 'peak-to-peak')
    return 'gives the corner, (e_pp/6.6)² = e²·(9.9 Hz + f_c·ln 100), of Gaussian noise';
  if (form !== 'spot') return null;
  if (hasWhite) return 'gives the corner beside the white noise, f_c = f·(e(f)²/e² − 1)';
  if (spots.length > 1)
    return column === spots[0].column
      ? 'with the other frequency: white noise and corner'
      : 'both give white noise and corner, e(f)² = e²·(1 + f_c/f)';
  return 'taken for white: this assumes that it lies well above the corner';
}
