import { type LibraryPart, type ListedFields, PART_FIELDS } from '../parts/index.js';
import { parseUnit, shortestNumber } from '../units/index.js';
import { harmlessCell } from './csvCells.js';
import type { DecimalMark } from './decimalMark.js';

/** A column of an exported list. */
export interface ExportColumn<Part> {
  heading: string;
  cell(part: Part): string;
}

/**
 * The columns in which a library is exported; an import reads each of their cells back to the very same value.
 * Figures stand in the catalogue's unit with all their digits, an unknown one as an empty cell; 1.234 stands as 1.2340,
 * so that nobody takes its mark for one that groups thousands.
 */
export function exportColumns<Part extends LibraryPart>(
  catalogue: ListedFields,
  mark: DecimalMark,
): ExportColumn<Part>[] {
  const { group, choice, parameters } = catalogue;
  const ofGroup = (part: Part) =>
    (part as unknown as Record<string, Record<string, string | number | null>>)[group];
  const texts = PART_FIELDS.map(({ key, label }) => ({
    heading: label,
    cell: (part: Part) => harmlessCell(part[key]),
  }));
  const figures = parameters.map(({ key, label, kind, displayUnit }) => {
    const unit = parseUnit(displayUnit, kind)!;
    return {
      heading: displayUnit === '' ? label : `${label} [${displayUnit}]`,
      cell: (part: Part) => figureCell(ofGroup(part)[key] as number | null, unit.exponent, mark),
    };
  });
  const origins = parameters.map(({ key, label }) => ({
    heading: `${label} origin`,
    cell: (part: Part) => part.origins[key] ?? '',
  }));
  return [
    ...texts,
    { heading: choice.label, cell: (part) => String(ofGroup(part)[choice.key] ?? '') },
    ...figures,
    ...origins,
  ];
}

function figureCell(value: number | null, exponent: number, mark: DecimalMark): string {
  if (value === null) return '';
  const text = shortestNumber(value, exponent).replaceAll('−', '-');
  return inMark(/^-?[1-9]\d{0,2}\.\d{3}$/.test(text) ? `${text}0` : text, mark);
}

function inMark(text: string, mark: DecimalMark): string {
  return mark === 'comma' ? text.replace('.', ',') : text;
}
