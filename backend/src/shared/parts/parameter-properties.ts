import { canBeUnknown, ORIGINS, type ParameterDefinition } from '@roothertz/common/parts';
import { Option } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';

/**
 * Gives a class a property for each parameter of a catalogue, so that a new parameter is one entry.
 *
 * @param describe the decorator of a parameter's property
 */
export function defineParameters(
  target: { prototype: object },
  parameters: readonly ParameterDefinition[],
  describe: (parameter: ParameterDefinition) => PropertyDecorator,
): void {
  for (const parameter of parameters) describe(parameter)(target.prototype, parameter.key);
}

/** A parameter of a part that is stated whole: what is left out has its default. */
export function stated(parameter: ParameterDefinition): PropertyDecorator {
  return Quantity(parameter, { optional: !parameter.required, nullable: canBeUnknown(parameter) });
}

/** A parameter of a change: what is left out stays. */
export function changed(parameter: ParameterDefinition): PropertyDecorator {
  return Quantity(parameter, { optional: true, nullable: canBeUnknown(parameter) });
}

/** A parameter of an answer: null = unknown. */
export function answered(parameter: ParameterDefinition): PropertyDecorator {
  return Quantity(parameter, { nullable: canBeUnknown(parameter) });
}

/** Where a figure comes from; one that isn't stated is a data sheet's typical value. */
export function origin(): PropertyDecorator {
  return Option(ORIGINS, { optional: true });
}

/** The origin in a change: what is left out stays, null takes a statement back. */
export function changedOrigin(): PropertyDecorator {
  return Option(ORIGINS, { optional: true, nullable: true });
}

/** The parameters that a request states, with the defaults of those that it leaves out. */
export function withFallbacks<Parameters>(
  parameters: readonly ParameterDefinition[],
  dto: object,
): Parameters {
  return {
    ...Object.fromEntries(parameters.map(({ key, fallback }) => [key, fallback])),
    ...dto,
  } as Parameters;
}
