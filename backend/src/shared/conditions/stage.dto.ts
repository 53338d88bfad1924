import {
  CONDITION_FIELDS,
  type StageConditions,
  TOPOLOGIES,
  type Topology,
} from '@roothertz/common/conditions';
import { Nested } from '../validation/nested.decorator.js';
import { Option } from '../validation/option.decorator.js';
import { Quantity } from '../validation/quantity.decorator.js';

export class NetworkDto {
  @Quantity(CONDITION_FIELDS['conditions.stage.network.minimumTotal'])
  minimumTotal: number;
}

/** The fields of all topologies: which of them a topology has and needs, `checkConditions` says. */
export class StageDto implements StageConditions {
  @Option(TOPOLOGIES)
  topology: Topology;

  @Quantity(CONDITION_FIELDS['conditions.stage.gain'], { optional: true })
  gain?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.gainResistance'], { optional: true })
  gainResistance?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.loadResistance'], { optional: true })
  loadResistance?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.differenceResistance'], { optional: true })
  differenceResistance?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.biasResistance'], { optional: true })
  biasResistance?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.feedbackResistance'], { optional: true })
  feedbackResistance?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.feedbackCapacitance'], { optional: true, orAuto: true })
  feedbackCapacitance?: number | 'auto';

  @Quantity(CONDITION_FIELDS['conditions.stage.outputVoltage'], { optional: true })
  outputVoltage?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.gainNoiseIndex'], { optional: true })
  gainNoiseIndex?: number;

  @Quantity(CONDITION_FIELDS['conditions.stage.feedbackNoiseIndex'], { optional: true })
  feedbackNoiseIndex?: number;

  @Nested(() => NetworkDto, { optional: true })
  network?: NetworkDto;
}
