import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { STAGE_SEARCH_FIELDS, STAGE_SORTS, type SoughtStage, type StageSort } from '@roothertz/common/noise';
import { OmitType } from '@nestjs/swagger';
import { OperatingConditionsDto } from '../../shared/conditions/operating-conditions.dto.js';
import { PartFilterDto } from '../../shared/conditions/part-filter.dto.js';
import { ResistorFilterDto } from '../../shared/conditions/resistor-ranking-request.dto.js';
import { StageDto } from '../../shared/conditions/stage.dto.js';
import { Nested } from '../../shared/validation/nested.decorator.js';
import { Option } from '../../shared/validation/option.decorator.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { PageLimit, PageOffset } from '../page.decorators.js';

export class NetworkLimitsDto {
  @Quantity(CONDITION_FIELDS['conditions.stage.network.minimumTotal'], { optional: true })
  minimumTotal: number = 500;

  @Quantity(STAGE_SEARCH_FIELDS['conditions.stage.network.maximumTotal'], { optional: true })
  maximumTotal?: number;
}

/** A stage whose network is to be found in the library. */
export class SoughtStageDto
  extends OmitType(StageDto, ['gainResistance', 'gainNoiseIndex', 'feedbackNoiseIndex', 'network'])
  implements Omit<SoughtStage, 'network'>
{
  @Quantity(STAGE_SEARCH_FIELDS['conditions.stage.gainTolerance'], { optional: true })
  gainTolerance: number = 0.01;

  @Nested(() => NetworkLimitsDto, { optional: true })
  network: NetworkLimitsDto = new NetworkLimitsDto();

  @Quantity(STAGE_SEARCH_FIELDS['conditions.stage.parallelMaximum'], { optional: true })
  parallelMaximum: number = 1;
}

export class SoughtConditionsDto extends OmitType(OperatingConditionsDto, ['stage']) {
  @Nested(() => SoughtStageDto)
  stage: SoughtStageDto;
}

export class RankStagesDto {
  @Nested(() => SoughtConditionsDto)
  conditions: SoughtConditionsDto;

  @Nested(() => PartFilterDto, { optional: true })
  filter: PartFilterDto = new PartFilterDto();

  @Nested(() => ResistorFilterDto, { optional: true })
  resistorFilter: ResistorFilterDto = new ResistorFilterDto();

  @Quantity(CONDITION_FIELDS.quantity, { optional: true })
  quantity: number = 1;

  @Option(STAGE_SORTS, { optional: true })
  sort: StageSort = 'inputNoiseRms';

  @Quantity(STAGE_SEARCH_FIELDS.within, { optional: true })
  within: number = 1;

  @PageLimit()
  limit: number = 50;

  @PageOffset()
  offset: number = 0;
}
