import {
  type Approval,
  APPROVALS,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import { ListQueryDto } from '../../shared/list/list-query.dto.js';
import { Options } from '../../shared/validation/option.decorator.js';

export const IN_QUERY = { optional: true, inQuery: true };

/** What narrows a list of parts of any kind. */
export class ListPartsDto extends ListQueryDto {
  @Options(LIBRARIES, IN_QUERY)
  library?: Library[];

  @Options(LIFECYCLES, IN_QUERY)
  lifecycle?: Lifecycle[];

  @Options(APPROVALS, IN_QUERY)
  approval?: Approval[];
}
