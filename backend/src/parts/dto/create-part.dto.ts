import { type Approval, APPROVALS, type Lifecycle, LIFECYCLES } from '@roothertz/common/parts';
import { Option } from '../../shared/validation/option.decorator.js';
import { PartText } from '../part-text.decorator.js';

/** What every new part has, whatever its kind. */
export class CreatePartDto {
  @PartText('manufacturer')
  manufacturer: string;

  @PartText('partNumber')
  partNumber: string;

  @PartText('description', { optional: true })
  description: string = '';

  @PartText('package', { optional: true })
  package: string = '';

  @Option(LIFECYCLES, { optional: true })
  lifecycle: Lifecycle = 'active';

  @Option(APPROVALS, { optional: true })
  approval: Approval = 'approved';
}
