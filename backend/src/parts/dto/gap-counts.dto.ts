import { ApiProperty } from '@nestjs/swagger';

export class MissingCountDto {
  @ApiProperty({ description: 'The key of a parameter or of the choice of words.' })
  parameter: string;

  @ApiProperty({ type: 'integer' })
  count: number;
}

/** How many parts lack what, what the ranking misses most first. */
export class GapCountsDto {
  @ApiProperty({ type: 'integer' })
  total: number;

  @ApiProperty({ type: 'integer', description: 'They lack nothing.' })
  complete: number;

  @ApiProperty({ type: [MissingCountDto] })
  missing: MissingCountDto[];
}
