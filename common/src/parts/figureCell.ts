import { parseQuantity } from '../units/index.js';
import { boundsError } from './bounds.js';
import { canBeUnknown, type ParameterDefinition } from './parameter.js';
import type { Reading } from './reading.js';

/**
 * Reads a cell of figures into SI units. A number alone is in the unit of the column's heading; a cell
 * that brings its own unit counts in that. An empty cell is an unknown figure (`null`), or the default
 * of a count; it is refused where the parameter is required.
 */
export function readFigure(
  parameter: ParameterDefinition,
  cell: string,
  unit: string,
): Reading<number | null> {
  if (cell.trim() === '') return readEmpty(parameter);
  const inColumnUnit = parseQuantity(`${cell} ${unit}`, parameter.kind);
  const parsed = inColumnUnit.ok ? inColumnUnit : parseQuantity(cell, parameter.kind);
  if (!parsed.ok) return { ok: false, message: `${parameter.label}: ${parsed.message}` };
  const message = boundsError(parameter, parsed.value);
  return message === null ? parsed : { ok: false, message };
}

function readEmpty(parameter: ParameterDefinition): Reading<number | null> {
  if (parameter.required) return { ok: false, message: `${parameter.label}: a value is needed` };
  return { ok: true, value: canBeUnknown(parameter) ? null : parameter.fallback };
}
