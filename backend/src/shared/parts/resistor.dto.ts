import { RESISTOR_PARAMETERS, TECHNOLOGIES, type Technology } from '@roothertz/common/parts';
import { Option } from '../validation/option.decorator.js';
import {
  answered,
  changed,
  changedOrigin,
  defineParameters,
  origin,
  stated,
} from './parameter-properties.js';

/** A resistor as a request states it whole. */
export class ResistorDto {
  @Option(TECHNOLOGIES, { optional: true, nullable: true })
  technology: Technology | null = null;
}
defineParameters(ResistorDto, RESISTOR_PARAMETERS, stated);

export class ResistorChangeDto {
  @Option(TECHNOLOGIES, { optional: true, nullable: true })
  technology?: Technology | null;
}
defineParameters(ResistorChangeDto, RESISTOR_PARAMETERS, changed);

export class ResistorParametersDto {
  @Option(TECHNOLOGIES, { nullable: true })
  technology: Technology | null;
}
defineParameters(ResistorParametersDto, RESISTOR_PARAMETERS, answered);

export class ResistorOriginsDto {}
defineParameters(ResistorOriginsDto, RESISTOR_PARAMETERS, origin);

export class ResistorOriginsChangeDto {}
defineParameters(ResistorOriginsChangeDto, RESISTOR_PARAMETERS, changedOrigin);
