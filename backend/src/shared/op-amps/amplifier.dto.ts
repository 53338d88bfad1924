import {
  type Amplifier,
  canBeUnknown,
  INPUT_TYPES,
  type InputType,
  OP_AMP_PARAMETERS,
} from '@roothertz/common/parts';
import { Option } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';
import { defineParameters } from './parameter-properties.js';

/** An amplifier as a request states it whole: null = unknown, and what is left out has its default. */
export class AmplifierDto {
  @Option(INPUT_TYPES, { optional: true, nullable: true })
  inputType: InputType | null = null;
}
defineParameters(AmplifierDto, (parameter) =>
  Quantity(parameter, { optional: !parameter.required, nullable: canBeUnknown(parameter) }),
);

/** An amplifier as a change states it: what is left out stays. */
export class AmplifierChangeDto {
  @Option(INPUT_TYPES, { optional: true, nullable: true })
  inputType?: InputType | null;
}
defineParameters(AmplifierChangeDto, (parameter) =>
  Quantity(parameter, { optional: true, nullable: canBeUnknown(parameter) }),
);

/** An amplifier as an answer states it: every parameter, null = unknown. */
export class AmplifierResponseDto {
  @Option(INPUT_TYPES, { nullable: true })
  inputType: InputType | null;
}
defineParameters(AmplifierResponseDto, (parameter) =>
  Quantity(parameter, { nullable: canBeUnknown(parameter) }),
);

export function toAmplifier(dto: AmplifierDto): Amplifier {
  const fallbacks = Object.fromEntries(OP_AMP_PARAMETERS.map(({ key, fallback }) => [key, fallback]));
  return { ...fallbacks, ...dto } as unknown as Amplifier;
}
