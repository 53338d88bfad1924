import { INPUT_TYPES, type InputType, OP_AMP_PARAMETERS } from '@roothertz/common/parts';
import { Option } from '../validation/option.decorator.js';
import {
  answered,
  changed,
  changedOrigin,
  defineParameters,
  origin,
  stated,
} from './parameter-properties.js';

/** An amplifier as a request states it whole. */
export class AmplifierDto {
  @Option(INPUT_TYPES, { optional: true, nullable: true })
  inputType: InputType | null = null;
}
defineParameters(AmplifierDto, OP_AMP_PARAMETERS, stated);

export class AmplifierChangeDto {
  @Option(INPUT_TYPES, { optional: true, nullable: true })
  inputType?: InputType | null;
}
defineParameters(AmplifierChangeDto, OP_AMP_PARAMETERS, changed);

export class AmplifierResponseDto {
  @Option(INPUT_TYPES, { nullable: true })
  inputType: InputType | null;
}
defineParameters(AmplifierResponseDto, OP_AMP_PARAMETERS, answered);

export class AmplifierOriginsDto {}
defineParameters(AmplifierOriginsDto, OP_AMP_PARAMETERS, origin);

export class AmplifierOriginsChangeDto {}
defineParameters(AmplifierOriginsChangeDto, OP_AMP_PARAMETERS, changedOrigin);
