import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { Id } from '../../shared/validation/id.decorator.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { OfferResponseDto } from './offer-response.dto.js';
import { SupplierResponseDto } from './supplier.dto.js';

export class PartOffersDto {
  @ApiProperty({ type: [OfferResponseDto], description: 'The offers that stand.' })
  current: OfferResponseDto[];

  @ApiProperty({ type: [OfferResponseDto], description: 'The closed ones, the latest first.' })
  history: OfferResponseDto[];
}

export class PriceHistoryQueryDto {
  @Id()
  partId: string;

  @Type(() => Number)
  @Quantity(CONDITION_FIELDS.quantity, { optional: true })
  quantity: number = 1;
}

export class PriceStepDto {
  @ApiProperty()
  offerId: string;

  @ApiProperty()
  supplier: SupplierResponseDto;

  @ApiProperty({ type: String, format: 'date-time' })
  from: string;

  @ApiProperty({ type: String, format: 'date-time', nullable: true, description: 'null = until now' })
  until: string | null;

  @ApiProperty({
    type: String,
    nullable: true,
    description: 'In the team’s currency at the rates of today; null where its currency has no rate.',
  })
  unitPrice: string | null;
}

export class PriceHistoryDto {
  @ApiProperty({ description: 'The team’s currency (ISO 4217).' })
  currency: string;

  @ApiProperty({ type: 'integer' })
  quantity: number;

  @ApiProperty({ type: [PriceStepDto], description: 'Each price from when to when, the earliest first.' })
  items: PriceStepDto[];
}
