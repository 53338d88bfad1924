import { AmplifierDto, AmplifierOriginsDto } from '../../shared/parts/amplifier.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { CreatePartDto } from './create-part.dto.js';

export class CreateOpAmpDto extends CreatePartDto {
  @Nested(() => AmplifierDto)
  amplifier: AmplifierDto;

  @Nested(() => AmplifierOriginsDto, { optional: true })
  origins: AmplifierOriginsDto = new AmplifierOriginsDto();
}
