import {
  AMPLIFIER_TEMPERATURE_MODELS,
  type AmplifierTemperatureModel,
  CONDITION_FIELDS,
} from '@roothertz/common/conditions';
import { Nested } from '../validation/nested.decorator.js';
import { Option } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';
import { BandDto } from './band.dto.js';
import { SourceDto } from './source.dto.js';
import { StageDto } from './stage.dto.js';

export class OperatingConditionsDto {
  @Nested(() => SourceDto)
  source: SourceDto;

  @Quantity(CONDITION_FIELDS['conditions.ambientTemperature'], { optional: true })
  ambientTemperature: number = 298.15;

  @Nested(() => BandDto)
  band: BandDto;

  @Nested(() => StageDto)
  stage: StageDto;

  /** Left out = the geometric mean of the band's limits. */
  @Quantity(CONDITION_FIELDS['conditions.referenceFrequency'], { optional: true })
  referenceFrequency?: number;

  @Quantity(CONDITION_FIELDS['conditions.bandwidthMargin'], { optional: true })
  bandwidthMargin: number = 3;

  @Option(AMPLIFIER_TEMPERATURE_MODELS, { optional: true })
  amplifierTemperatureModel: AmplifierTemperatureModel = 'estimated';
}
