import type { FieldError } from '@roothertz/common/parts';
import type { ValidationError } from 'class-validator';

const REWORDED: Record<string, string> = {
  whitelistValidation: 'unknown field',
  nestedValidation: 'an object was expected',
  unknownValue: 'an object was expected',
};

/** One line for each field that class-validator refuses, by its whole path. */
export function toFieldErrors(errors: readonly ValidationError[], parent = ''): FieldError[] {
  return errors.flatMap(({ property, constraints, children }) => {
    const field = pathOf(parent, property ?? '');
    const [constraint] = Object.entries(constraints ?? {});
    const own = constraint ? [{ field, message: REWORDED[constraint[0]] ?? constraint[1] }] : [];
    return [...own, ...toFieldErrors(children ?? [], field)];
  });
}

/** `conditions.band`, and `rows[3]` for an item of a list. */
function pathOf(parent: string, property: string): string {
  if (parent === '') return property;
  return /^\d+$/.test(property) ? `${parent}[${property}]` : `${parent}.${property}`;
}
