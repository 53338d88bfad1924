import { ApiProperty } from '@nestjs/swagger';

export class CheaperOrderDto {
  @ApiProperty({ type: 'integer' })
  orderQuantity: number;

  @ApiProperty()
  total: string;
}

/** What the team pays for a part at a quantity, from the supplier where it costs least in all. */
export class PriceDto {
  @ApiProperty({
    description:
      'Decimal number: the total over the pieces that are needed, so that it holds what MOQ and order multiple add.',
  })
  amount: string;

  @ApiProperty({ description: 'The team’s currency (ISO 4217).' })
  currency: string;

  @ApiProperty({ type: 'integer', description: 'From how many pieces on the price break holds.' })
  minimumQuantity: number;

  @ApiProperty({ type: 'integer', description: 'Pieces that have to be bought.' })
  orderQuantity: number;

  @ApiProperty({ description: 'Decimal number: what these pieces cost.' })
  total: string;

  @ApiProperty({ type: CheaperOrderDto, nullable: true, description: 'More pieces that cost less in all.' })
  cheaperOrder: CheaperOrderDto | null;

  @ApiProperty()
  supplier: string;

  @ApiProperty({ type: 'integer', nullable: true, description: 'null = unknown' })
  leadTimeDays: number | null;

  @ApiProperty({ type: 'integer', nullable: true, description: 'null = unknown' })
  stock: number | null;

  @ApiProperty({ description: 'Nobody has confirmed it for longer than the team allows.' })
  isStale: boolean;
}
