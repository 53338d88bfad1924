import { AmplifierChangeDto, AmplifierOriginsChangeDto } from '../../shared/parts/amplifier.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { UpdatePartDto } from './update-part.dto.js';

export class UpdateOpAmpDto extends UpdatePartDto {
  @Nested(() => AmplifierChangeDto, { optional: true })
  amplifier?: AmplifierChangeDto;

  @Nested(() => AmplifierOriginsChangeDto, { optional: true })
  origins?: AmplifierOriginsChangeDto;
}
