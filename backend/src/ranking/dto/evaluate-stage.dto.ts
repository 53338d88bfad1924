import { OperatingConditionsDto } from '../../shared/conditions/operating-conditions.dto.js';
import { AmplifierDto } from '../../shared/parts/amplifier.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';

export class EvaluateStageDto {
  @Nested(() => OperatingConditionsDto)
  conditions: OperatingConditionsDto;

  @Nested(() => AmplifierDto)
  amplifier: AmplifierDto;
}
