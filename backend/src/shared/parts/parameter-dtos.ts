import { canBeUnknown, type ListedFields, ORIGINS, type ParameterDefinition } from '@roothertz/common/parts';
import type { Type } from '@nestjs/common';
import { Option } from '../validation/option.decorator.js';
import type { Presence } from '../validation/presence.js';
import { Quantity } from '../validation/quantity.decorator.js';

type Describe = (parameter: ParameterDefinition) => PropertyDecorator;

/** The parameters of a part that is stated whole: what is left out has its default. */
export function statedParameters<Choice extends object>(fields: ListedFields): Type<Choice> {
  const { key } = fields.choice;
  class StatedParameters {
    constructor() {
      Object.assign(this, { [key]: null });
    }
  }
  return parametersOf<Choice>(StatedParameters, fields, { optional: true, nullable: true }, (parameter) =>
    Quantity(parameter, { optional: !parameter.required, nullable: canBeUnknown(parameter) }),
  );
}

/** The parameters of a change: what is left out stays. */
export function changedParameters<Choice extends object>(fields: ListedFields): Type<Partial<Choice>> {
  return parametersOf(class {}, fields, { optional: true, nullable: true }, (parameter) =>
    Quantity(parameter, { optional: true, nullable: canBeUnknown(parameter) }),
  );
}

/** The parameters of an answer: null = unknown. */
export function answeredParameters<Choice extends object>(fields: ListedFields): Type<Choice> {
  return parametersOf(class {}, fields, { nullable: true }, (parameter) =>
    Quantity(parameter, { nullable: canBeUnknown(parameter) }),
  );
}

/** Where each figure comes from; one that isn't stated is a data sheet's typical value. */
export function statedOrigins({ parameters }: ListedFields): Type<object> {
  return defineParameters(class {}, parameters, () => Option(ORIGINS, { optional: true }));
}

/** The origins in a change: what is left out stays, null takes a statement back. */
export function changedOrigins({ parameters }: ListedFields): Type<object> {
  return defineParameters(class {}, parameters, () => Option(ORIGINS, { optional: true, nullable: true }));
}

function parametersOf<Choice extends object>(
  target: Type<object>,
  { choice, parameters }: ListedFields,
  presence: Presence,
  describe: Describe,
): Type<Choice> {
  Option(choice.options, presence)(target.prototype, choice.key);
  return defineParameters(target, parameters, describe) as Type<Choice>;
}

/** Gives a class a property for each parameter of a catalogue, so that a new parameter is one entry. */
function defineParameters(
  target: Type<object>,
  parameters: readonly ParameterDefinition[],
  describe: Describe,
): Type<object> {
  for (const parameter of parameters) describe(parameter)(target.prototype, parameter.key);
  return target;
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
