import type { QuantityField } from '@roothertz/common/parts';
import { Quantity } from '../shared/validation/quantity.decorator.js';

const LIMIT: QuantityField = {
  label: 'limit',
  kind: 'count',
  integer: true,
  bounds: { from: 1, to: 1000 },
  help: 'How many items the answer holds at most.',
};
const OFFSET: QuantityField = {
  label: 'offset',
  kind: 'count',
  integer: true,
  bounds: { from: 0, to: 1e9 },
  help: 'How many items come before the first one of the answer.',
};

/** The limit of a page that a request's body asks for. */
export function PageLimit(): PropertyDecorator {
  return Quantity(LIMIT, { optional: true });
}

/** The offset of a page that a request's body asks for. */
export function PageOffset(): PropertyDecorator {
  return Quantity(OFFSET, { optional: true });
}
