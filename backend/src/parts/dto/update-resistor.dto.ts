import { ResistorChangeDto, ResistorOriginsChangeDto } from '../../shared/parts/resistor.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { UpdatePartDto } from './update-part.dto.js';

export class UpdateResistorDto extends UpdatePartDto {
  @Nested(() => ResistorChangeDto, { optional: true })
  resistor?: ResistorChangeDto;

  @Nested(() => ResistorOriginsChangeDto, { optional: true })
  origins?: ResistorOriginsChangeDto;
}
