import { type Approval, APPROVALS, type Lifecycle, LIFECYCLES } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { Option } from '../../shared/validation/option.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';
import { SaysSomething } from './change-standings.dto.js';

/** How all parts of a filter would stand. */
export class WantedStandingDto {
  @Option(LIFECYCLES, { optional: true })
  toLifecycle?: Lifecycle;

  @Option(APPROVALS, { optional: true })
  toApproval?: Approval;
}

export class StandingOutcomeDto {
  @ApiProperty({ type: 'integer', description: 'Parts that the filter lets through.' })
  chosen: number;

  @ApiProperty({ type: 'integer' })
  changed: number;

  @ApiProperty({ type: 'integer', description: 'They stand so already.' })
  unchanged: number;

  @ApiProperty({ type: 'integer', description: 'They can’t be changed.' })
  curated: number;

  @ApiProperty({ type: 'integer', description: 'What the outcome was said of: the team’s library then.' })
  libraryRevision: number;
}

/** How all parts of a filter are to stand: all of them, or none where the library has changed since the outcome was said. */
export class ChangeMatchingDto {
  @SaysSomething()
  @Version()
  libraryRevision: number;

  @Option(LIFECYCLES, { optional: true })
  lifecycle?: Lifecycle;

  @Option(APPROVALS, { optional: true })
  approval?: Approval;
}

export class MatchingChangedDto {
  @ApiProperty({ description: 'By which the change can be taken back for a day.' })
  id: string;

  @ApiProperty({ type: 'integer' })
  changed: number;
}

export class StandingsBackDto {
  @ApiProperty({ type: 'integer' })
  takenBack: number;

  @ApiProperty({ type: 'integer', description: 'They were changed since, and stay.' })
  kept: number;
}
