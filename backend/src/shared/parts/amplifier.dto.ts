import { type Amplifier, OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import {
  answeredParameters,
  changedOrigins,
  changedParameters,
  statedOrigins,
  statedParameters,
} from './parameter-dtos.js';

type Choice = Pick<Amplifier, 'inputType'>;

export class AmplifierDto extends statedParameters<Choice>(OP_AMP_CATALOGUE) {}
export class AmplifierChangeDto extends changedParameters<Choice>(OP_AMP_CATALOGUE) {}
export class AmplifierResponseDto extends answeredParameters<Choice>(OP_AMP_CATALOGUE) {}
export class AmplifierOriginsDto extends statedOrigins(OP_AMP_CATALOGUE) {}
export class AmplifierOriginsChangeDto extends changedOrigins(OP_AMP_CATALOGUE) {}
