import { INPUT_TYPES, type InputType } from '@roothertz/common/parts';
import { Options } from '../../shared/validation/option.decorator.js';
import { IN_QUERY, ListPartsDto } from './list-parts.dto.js';

export class ListOpAmpsDto extends ListPartsDto {
  @Options(INPUT_TYPES, IN_QUERY)
  inputType?: InputType[];
}
