import type { Type } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { DUPLICATE_REASONS, type DuplicateReason } from '@roothertz/common/parts';

/** Two parts that may be one, and why. */
export interface Duplicate<Part> {
  likelihood: number;
  reasons: DuplicateReason[];
  one: Part;
  other: Part;
}

/** The class of a pair of parts of a kind, for OpenAPI. */
export function duplicateOf<Part>(part: Type<Part>): Type<Duplicate<Part>> {
  class DuplicateDto implements Duplicate<Part> {
    @ApiProperty({ description: 'From 0 to 1.' })
    likelihood: number;

    @ApiProperty({ enum: DUPLICATE_REASONS, isArray: true })
    reasons: DuplicateReason[];

    @ApiProperty({ type: part, description: 'One of the team’s own.' })
    one: Part;

    @ApiProperty({ type: part })
    other: Part;
  }
  return DuplicateDto;
}
