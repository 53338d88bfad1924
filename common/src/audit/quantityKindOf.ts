import { CONDITION_FIELDS } from '../conditions/index.js';
import { OP_AMP_PARAMETERS, RESISTOR_PARAMETERS } from '../parts/index.js';
import type { QuantityKind } from '../units/index.js';

const KINDS: ReadonlyMap<string, QuantityKind> = new Map([
  ...OP_AMP_PARAMETERS.map(({ key, kind }): [string, QuantityKind] => [`amplifier.${key}`, kind]),
  ...RESISTOR_PARAMETERS.map(({ key, kind }): [string, QuantityKind] => [`resistor.${key}`, kind]),
  ...Object.entries(CONDITION_FIELDS).map(([path, { kind }]): [string, QuantityKind] => [
    path.replace(/^conditions\./, ''),
    kind,
  ]),
]);

/** What kind of quantity stands at a place of a part or of saved conditions; undefined = none that is known. */
export function quantityKindOf(path: readonly string[]): QuantityKind | undefined {
  return KINDS.get(path.join('.'));
}
