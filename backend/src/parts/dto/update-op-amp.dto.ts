import { type Approval, APPROVALS, type Lifecycle, LIFECYCLES } from '@roothertz/common/parts';
import { AmplifierChangeDto } from '../../shared/op-amps/amplifier.dto.js';
import { OriginsChangeDto } from '../../shared/op-amps/origins.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { Option } from '../../shared/validation/option.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';
import { PartText } from '../part-text.decorator.js';

/** A change of an op-amp: what is left out stays. */
export class UpdateOpAmpDto {
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

  @Nested(() => AmplifierChangeDto, { optional: true })
  amplifier?: AmplifierChangeDto;

  @Nested(() => OriginsChangeDto, { optional: true })
  origins?: OriginsChangeDto;
}
