import { type Approval, APPROVALS, type Lifecycle, LIFECYCLES } from '@roothertz/common/parts';
import { Option } from '../../shared/validation/option.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';
import { PartText } from '../part-text.decorator.js';

/** A change of a part of any kind: what is left out stays. */
export class UpdatePartDto {
  @Version()
  version: number;

  @PartText('manufacturer', { optional: true })
  manufacturer?: string;

  @PartText('partNumber', { optional: true })
  partNumber?: string;

  @PartText('description', { optional: true })
  description?: string;

  @PartText('package', { optional: true })
  package?: string;

  @Option(LIFECYCLES, { optional: true })
  lifecycle?: Lifecycle;

  @Option(APPROVALS, { optional: true })
  approval?: Approval;
}
