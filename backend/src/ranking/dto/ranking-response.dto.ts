import { EXCLUSION_REASONS, type ExclusionReason } from '@roothertz/common/noise';
import type { Amplifier, AmplifierOrigins } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { AmplifierOriginsDto, AmplifierResponseDto } from '../../shared/parts/amplifier.dto.js';
import { PartNameDto } from '../../shared/parts/part-name.dto.js';
import { PriceDto } from './price.dto.js';
import { SourceFloorDto, StageFiguresDto } from './stage-figures.dto.js';

export class RankedPartDto extends PartNameDto {
  @ApiProperty({ type: AmplifierResponseDto })
  amplifier: Amplifier;

  @ApiProperty({ type: AmplifierOriginsDto })
  origins: AmplifierOrigins;
}

export class RankedOpAmpDto extends StageFiguresDto {
  @ApiProperty({ type: 'integer' })
  rank: number;

  @ApiProperty()
  part: RankedPartDto;

  @ApiProperty({ description: 'Its total can’t be told from the quietest one’s at one sigma.' })
  quietSet: boolean;

  @ApiProperty({ type: Boolean, nullable: true, description: 'null where there is no target.' })
  meetsTarget: boolean | null;

  @ApiProperty({ type: PriceDto, nullable: true, description: 'null where the team has no price.' })
  unitPrice: PriceDto | null;
}

export class ExclusionCountDto {
  @ApiProperty({ enum: EXCLUSION_REASONS })
  reason: ExclusionReason;

  @ApiProperty({ type: 'integer' })
  count: number;
}

export class ExcludedDto {
  @ApiProperty({ type: 'integer' })
  total: number;

  @ApiProperty({ type: [ExclusionCountDto] })
  reasons: ExclusionCountDto[];
}

export class QuietSetDto {
  @ApiProperty({ type: 'integer', description: 'How many parts can’t be told from the quietest one.' })
  total: number;
}

export class CheapestDto {
  @ApiProperty()
  part: PartNameDto;

  @ApiProperty()
  unitPrice: PriceDto;

  @ApiProperty({ description: 'In dB, its total over the quietest part’s.' })
  aboveQuietest: number;
}

export class FrontierPartDto {
  @ApiProperty()
  part: PartNameDto;

  @ApiProperty({ description: 'V (A in a transimpedance stage), over the band.' })
  inputNoiseRms: number;

  @ApiProperty()
  unitPrice: PriceDto;
}

export class RankingResponseDto {
  @ApiProperty({ type: 'integer', description: 'How many parts are ranked.' })
  total: number;

  @ApiProperty()
  excluded: ExcludedDto;

  @ApiProperty()
  quietSet: QuietSetDto;

  @ApiProperty({
    type: CheapestDto,
    nullable: true,
    description: 'The cheapest part of the quiet set; null where none of it has a price.',
  })
  cheapest: CheapestDto | null;

  @ApiProperty({
    type: [FrontierPartDto],
    description:
      'The noise–price frontier, the quietest first: each part is cheaper than any that is as quiet. Parts without a price don’t count.',
  })
  frontier: FrontierPartDto[];

  @ApiProperty()
  floor: SourceFloorDto;

  @ApiProperty({ description: 'Changes whenever a part that could be ranked changes.' })
  libraryRevision: string;

  @ApiProperty({ type: [RankedOpAmpDto] })
  items: RankedOpAmpDto[];
}
