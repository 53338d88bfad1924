import { boundsError, type FieldError, type QuantityField } from '../parts/index.js';
import type { BandConditions } from './conditions.js';

/** Every value of a request that is out of its field's bounds; what is left out is passed over. */
export function checkFields(fields: Readonly<Record<string, QuantityField>>, request: object): FieldError[] {
  return Object.entries(fields).flatMap(([field, definition]) => {
    const value = valueAt(request, field);
    const message = value === undefined ? null : boundsError(definition, value);
    return message === null ? [] : [{ field, message }];
  });
}

/** A band that ends where it begins, or before. */
export function checkBandLimits({ lower, upper }: BandConditions): FieldError[] {
  if (upper > lower) return [];
  const message = 'upper band limit: a frequency above the lower limit was expected';
  return [{ field: 'conditions.band.upper', message }];
}

function valueAt(request: object, path: string): unknown {
  return path
    .split('.')
    .reduce<unknown>((value, key) => (value as Record<string, unknown> | undefined)?.[key], request);
}
