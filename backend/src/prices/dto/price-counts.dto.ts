import { ApiProperty } from '@nestjs/swagger';

/** How much of the grid there is to look after. */
export class PriceCountsDto {
  @ApiProperty({ type: 'integer', description: 'Offers that stand.' })
  offers: number;

  @ApiProperty({ type: 'integer' })
  stale: number;

  @ApiProperty({ type: 'integer' })
  expiring: number;

  @ApiProperty({ type: 'integer' })
  expired: number;

  @ApiProperty({ type: 'integer', description: 'Parts of the team’s own library without an offer.' })
  missing: number;

  @ApiProperty({ type: 'integer', description: 'Rows of parts that are chosen in saved conditions.' })
  usedInConditions: number;
}
