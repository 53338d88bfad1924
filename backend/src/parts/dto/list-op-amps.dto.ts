import {
  type Approval,
  APPROVALS,
  INPUT_TYPES,
  type InputType,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import { ListQueryDto } from '../../shared/list/list-query.dto.js';
import { Options } from '../../shared/validation/option.decorator.js';

const IN_QUERY = { optional: true, inQuery: true };

export class ListOpAmpsDto extends ListQueryDto {
  @Options(LIBRARIES, IN_QUERY)
  library?: Library[];

  @Options(LIFECYCLES, IN_QUERY)
  lifecycle?: Lifecycle[];

  @Options(APPROVALS, IN_QUERY)
  approval?: Approval[];

  @Options(INPUT_TYPES, IN_QUERY)
  inputType?: InputType[];
}
