import { ResistorDto, ResistorOriginsDto } from '../../shared/parts/resistor.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { CreatePartDto } from './create-part.dto.js';

export class CreateResistorDto extends CreatePartDto {
  @Nested(() => ResistorDto)
  resistor: ResistorDto;

  @Nested(() => ResistorOriginsDto, { optional: true })
  origins: ResistorOriginsDto = new ResistorOriginsDto();
}
