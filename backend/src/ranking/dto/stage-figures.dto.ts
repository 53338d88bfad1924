import {
  type Caution,
  CAUTIONS,
  type Contributions,
  type Contributor,
  CONTRIBUTORS,
  type SourceFloor,
  type StageFigures,
} from '@roothertz/common/noise';
import { ApiProperty } from '@nestjs/swagger';

export class SourceFloorDto implements SourceFloor {
  @ApiProperty({ description: 'V/√Hz (A/√Hz in a transimpedance stage), at the reference frequency.' })
  inputNoiseDensity: number;

  @ApiProperty({ description: 'V (A in a transimpedance stage), over the band.' })
  inputNoiseRms: number;
}

/** Rms of each contributor, referred to the source; the squares add up to that of the total. */
export class ContributionsDto {}
for (const contributor of CONTRIBUTORS)
  ApiProperty({ type: Number })(ContributionsDto.prototype, contributor);

export class StageFiguresDto extends SourceFloorDto implements StageFigures {
  @ApiProperty({ description: 'V, over the band.' })
  outputNoiseRms: number;

  @ApiProperty({ description: 'V/V (V/A in a transimpedance stage), at the reference frequency.' })
  signalGain: number;

  @ApiProperty({ type: Number, nullable: true, description: 'Hz; null where the GBW is unknown.' })
  closedLoopBandwidth: number | null;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'dB, at the reference frequency; null where the source makes no noise.',
  })
  noiseFigure: number | null;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'dB, over the band; null where the source makes no noise.',
  })
  aboveFloor: number | null;

  @ApiProperty({ type: ContributionsDto })
  contributions: Contributions;

  @ApiProperty({ enum: CONTRIBUTORS })
  dominant: Contributor;

  @ApiProperty({ enum: CAUTIONS, isArray: true })
  cautions: Caution[];
}
