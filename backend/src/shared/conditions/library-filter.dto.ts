import {
  type Approval,
  APPROVALS,
  LIBRARIES,
  type Library,
  type Lifecycle,
  LIFECYCLES,
} from '@roothertz/common/parts';
import { Options } from '../validation/option.decorator.js';
import { Text } from '../validation/text.decorator.js';

/** What narrows a ranking of parts of any kind. */
export class LibraryFilterDto {
  @Text({ label: 'search', maxLength: 200, optional: true })
  search?: string;

  @Options(LIBRARIES, { optional: true })
  library?: Library[];

  @Options(LIFECYCLES, { optional: true })
  lifecycle?: Lifecycle[];

  @Options(APPROVALS, { optional: true })
  approval?: Approval[];

  @Text({ label: 'package', maxLength: 60, optional: true })
  package?: string;
}
