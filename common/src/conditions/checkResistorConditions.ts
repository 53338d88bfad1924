import type { FieldError } from '../parts/index.js';
import { checkBandLimits, checkFields } from './checkFields.js';
import { RESISTOR_CONDITION_FIELDS } from './resistorConditionFields.js';
import type { ResistorRankingRequest } from './resistorConditions.js';

/** Everything that is wrong with a request to rank resistors, field by field. Empty = it can be ranked. */
export function checkResistorConditions(request: ResistorRankingRequest): FieldError[] {
  const bounds = checkFields(RESISTOR_CONDITION_FIELDS, request);
  return bounds.length > 0 ? bounds : checkBandLimits(request.conditions.band);
}
