import { UNSOUGHT_PLACES, type UnsoughtPieces, type UnsoughtPlace } from '@roothertz/common/noise';
import { TECHNOLOGIES, type Technology } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';
import { ExcludedDto, RankedPartDto } from './ranking-response.dto.js';
import { PriceDto } from './price.dto.js';
import { SourceFloorDto, StageFiguresDto } from './stage-figures.dto.js';

export class NetworkPartDto extends PartNameDto {
  @ApiProperty({ description: 'In Ω.' })
  resistance: number;

  @ApiProperty({ type: Number, nullable: true, description: 'In dB (IEC 60195); null = unknown.' })
  noiseIndex: number | null;

  @ApiProperty({ type: Number, nullable: true, description: '0.01 = 1 %; null = unknown.' })
  tolerance: number | null;

  @ApiProperty({ enum: TECHNOLOGIES, nullable: true, description: 'null = unknown' })
  technology: Technology | null;
}

export class RankedNetworkDto {
  @ApiProperty({ description: 'As the two values give it; V/V, or V/A in a transimpedance stage.' })
  gain: number;

  @ApiProperty({ type: NetworkPartDto, nullable: true, description: 'null where the stage has none.' })
  gainResistor: NetworkPartDto | null;

  @ApiProperty({ type: NetworkPartDto, nullable: true, description: 'null in a follower.' })
  feedbackResistor: NetworkPartDto | null;
}

const STAGE_PLACES = ['op-amp', 'gain', 'feedback'] as const;
export type StagePlace = (typeof STAGE_PLACES)[number];

export class StagePieceDto {
  @ApiProperty({
    enum: STAGE_PLACES,
    isArray: true,
    description: 'Where the part stands: one part may be both gain and feedback resistor.',
  })
  places: StagePlace[];

  @ApiProperty({ type: 'integer', description: 'In one stage.' })
  pieces: number;

  @ApiProperty({
    type: PriceDto,
    nullable: true,
    description: 'At the pieces of all stages; null where the team has no price.',
  })
  unitPrice: PriceDto | null;
}

export class UnsoughtPiecesDto implements UnsoughtPieces {
  @ApiProperty({ enum: UNSOUGHT_PLACES })
  place: UnsoughtPlace;

  @ApiProperty({ type: 'integer', description: 'In one stage.' })
  pieces: number;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'In Ω, of the capacitor in F; null = not stated.',
  })
  value: number | null;
}

export class StagePriceDto {
  @ApiProperty({ description: 'Decimal number: the total over the stages that are wanted.' })
  amount: string;

  @ApiProperty({ description: 'The team’s currency (ISO 4217).' })
  currency: string;

  @ApiProperty({ description: 'Decimal number: what the pieces of all stages cost.' })
  total: string;

  @ApiProperty({ description: 'Nobody has confirmed one of the prices for longer than the team allows.' })
  isStale: boolean;
}

export class WholeStageDto extends StageFiguresDto {
  @ApiProperty()
  part: RankedPartDto;

  @ApiProperty({ type: 'integer', description: 'Identical channels of the package in parallel.' })
  channelsInParallel: number;

  @ApiProperty()
  network: RankedNetworkDto;

  @ApiProperty({
    type: StagePriceDto,
    nullable: true,
    description: 'Of op-amps and found resistors; null where one of them is without a price.',
  })
  unitPrice: StagePriceDto | null;

  @ApiProperty({ type: [StagePieceDto], description: 'The parts of a stage that the price is made of.' })
  pieces: StagePieceDto[];

  @ApiProperty({
    type: [UnsoughtPiecesDto],
    description:
      'What a stage takes besides: the search doesn’t choose these parts, and the price is without them.',
  })
  unsought: UnsoughtPiecesDto[];
}

export class RankedStageDto extends WholeStageDto {
  @ApiProperty({ type: 'integer' })
  rank: number;
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
    description:
      'How many op-amps are ranked, each with its quietest network; by price, each that makes a stage within the noise allowed, with the cheapest network that does.',
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

  @ApiProperty({
    type: [WholeStageDto],
    description:
      'The noise–price frontier of all stages, the quietest first: each is cheaper than any that is as quiet. Stages without a price don’t count.',
  })
  frontier: WholeStageDto[];
}
