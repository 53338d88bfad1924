import { type Approval, APPROVALS, type Lifecycle, LIFECYCLES } from '@roothertz/common/parts';
import { AmplifierDto } from '../../shared/op-amps/amplifier.dto.js';
import { OriginsDto } from '../../shared/op-amps/origins.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { Option } from '../../shared/validation/option.decorator.js';
import { PartText } from '../part-text.decorator.js';

export class CreateOpAmpDto {
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

  @Nested(() => AmplifierDto)
  amplifier: AmplifierDto;

  @Nested(() => OriginsDto, { optional: true })
  origins: OriginsDto = new OriginsDto();
}
