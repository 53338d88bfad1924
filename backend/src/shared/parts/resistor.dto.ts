import { type Resistor, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import {
  answeredParameters,
  changedOrigins,
  changedParameters,
  statedOrigins,
  statedParameters,
} from './parameter-dtos.js';

type Choice = Pick<Resistor, 'technology'>;

export class ResistorDto extends statedParameters<Choice>(RESISTOR_CATALOGUE) {}
export class ResistorChangeDto extends changedParameters<Choice>(RESISTOR_CATALOGUE) {}
export class ResistorParametersDto extends answeredParameters<Choice>(RESISTOR_CATALOGUE) {}
export class ResistorOriginsDto extends statedOrigins(RESISTOR_CATALOGUE) {}
export class ResistorOriginsChangeDto extends changedOrigins(RESISTOR_CATALOGUE) {}
