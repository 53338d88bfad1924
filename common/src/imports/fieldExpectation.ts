import { describeBounds, type ListedFields, ORIGINS, PART_FIELDS, type TextField } from '../parts/index.js';
import { QUANTITIES } from '../units/index.js';
import type { ColumnMapping } from './columnMapping.js';

/** What the cells of a column may hold, in words. */
export function fieldExpectation(
  catalogue: ListedFields,
  { field, form }: Pick<ColumnMapping, 'field' | 'form'>,
): string {
  if (form === 'origin') return `one of ${ORIGINS.join(', ')}`;
  if (form === 'peak-to-peak') return `a voltage, such as ${QUANTITIES.voltage.alternative}`;
  const parameter = catalogue.parameters.find(({ key }) => key === field);
  if (parameter !== undefined)
    return `${describeBounds(parameter)}, such as ${QUANTITIES[parameter.kind].example}`;
  return textExpectation([...PART_FIELDS, catalogue.choice].find(({ key }) => key === field)!);
}

function textExpectation({ options, maxLength }: TextField): string {
  return options === undefined
    ? `a text of at most ${maxLength} characters on one line`
    : `one of ${options.join(', ')}`;
}
