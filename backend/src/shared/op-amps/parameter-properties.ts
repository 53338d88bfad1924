import { OP_AMP_PARAMETERS, type OpAmpParameterKey, type ParameterDefinition } from '@roothertz/common/parts';

/**
 * Gives a class a property for each parameter of the catalogue, so that a new parameter is one entry.
 *
 * @param describe the decorator of a parameter's property
 */
export function defineParameters(
  target: { prototype: object },
  describe: (parameter: ParameterDefinition<OpAmpParameterKey>) => PropertyDecorator,
): void {
  for (const parameter of OP_AMP_PARAMETERS) describe(parameter)(target.prototype, parameter.key);
}
