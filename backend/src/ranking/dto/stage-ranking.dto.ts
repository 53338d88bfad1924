import { ApiProperty } from '@nestjs/swagger';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';
import { ExcludedDto, RankedPartDto } from './ranking-response.dto.js';
import { SourceFloorDto, StageFiguresDto } from './stage-figures.dto.js';

export class NetworkPartDto extends PartNameDto {
  @ApiProperty({ description: 'In Ω.' })
  resistance: number;
}

export class RankedNetworkDto {
  @ApiProperty({ description: 'As the two values give it; V/V, or V/A in a transimpedance stage.' })
  gain: number;

  @ApiProperty({ type: NetworkPartDto, nullable: true, description: 'null where the stage has none.' })
  gainResistor: NetworkPartDto | null;

  @ApiProperty({ type: NetworkPartDto, nullable: true, description: 'null in a follower.' })
  feedbackResistor: NetworkPartDto | null;
}

export class RankedStageDto extends StageFiguresDto {
  @ApiProperty({ type: 'integer' })
  rank: number;

  @ApiProperty()
  part: RankedPartDto;

  @ApiProperty({ type: 'integer', description: 'Identical channels of the package in parallel.' })
  channelsInParallel: number;

  @ApiProperty()
  network: RankedNetworkDto;
}

export class EvaluationsDto {
  @ApiProperty({ type: 'integer', description: 'Stages whose noise was computed.' })
  made: number;

  @ApiProperty({ type: 'integer', description: 'Stages that there are.' })
  exhaustive: number;
}

export class StageRankingDto {
  @ApiProperty({
    type: 'integer',
    description: 'How many op-amps are ranked, each with its quietest network.',
  })
  total: number;

  @ApiProperty()
  excluded: ExcludedDto;

  @ApiProperty()
  floor: SourceFloorDto;

  @ApiProperty({ type: 'integer', description: 'How many pairs of resistors give the gain.' })
  pairs: number;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'The nearest gain that the library can give within the network’s limits; null = none.',
  })
  nearestGain: number | null;

  @ApiProperty()
  evaluations: EvaluationsDto;

  @ApiProperty({ description: 'Changes whenever a part that could be ranked changes.' })
  libraryRevision: string;

  @ApiProperty({ type: [RankedStageDto] })
  items: RankedStageDto[];
}
