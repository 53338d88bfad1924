import { LIBRARIES, type Library, PART_KINDS, type PartKind } from '@roothertz/common/parts';
import { OFFER_STATES, type OfferState } from '@roothertz/common/prices';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { MemberDto } from '../../shared/members/member.dto.js';
import { SupplierResponseDto } from './supplier.dto.js';

export class OfferedPartDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: LIBRARIES })
  library: Library;

  @ApiProperty({ enum: PART_KINDS })
  kind: PartKind;

  @ApiProperty()
  manufacturer: string;

  @ApiProperty()
  partNumber: string;
}

export class BreakResponseDto {
  @ApiProperty({ type: 'integer' })
  minimumQuantity: number;

  @ApiProperty({ description: 'Decimal number with four decimals.' })
  unitPrice: string;
}

export class OfferResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  part: OfferedPartDto;

  @ApiProperty()
  supplier: SupplierResponseDto;

  @ApiProperty()
  supplierNumber: string;

  @ApiProperty({ description: 'ISO 4217' })
  currency: string;

  @ApiProperty({ type: [BreakResponseDto], description: 'In ascending order of quantity.' })
  breaks: BreakResponseDto[];

  @ApiProperty({ type: 'integer' })
  minimumOrderQuantity: number;

  @ApiProperty({ type: 'integer' })
  orderMultiple: number;

  @ApiProperty({ type: 'integer', nullable: true, description: 'null = unknown' })
  leadTimeDays: number | null;

  @ApiProperty({ type: 'integer', nullable: true, description: 'null = unknown' })
  stock: number | null;

  @ApiProperty({ type: String, format: 'date' })
  validFrom: string;

  @ApiProperty({ type: String, format: 'date', nullable: true, description: 'null = until further notice' })
  validUntil: string | null;

  @ApiProperty({ type: String, format: 'date-time' })
  confirmedAt: string;

  @ApiProperty({ type: MemberDto, nullable: true })
  confirmedBy: MemberDto | null;

  @ApiProperty({ type: String, format: 'date-time', description: 'Since when these terms stand.' })
  openedAt: string;

  @ApiProperty({ type: MemberDto, nullable: true })
  openedBy: MemberDto | null;

  @ApiProperty({
    type: String,
    format: 'date-time',
    nullable: true,
    description: 'When other terms took their place, or none; null = they stand.',
  })
  closedAt: string | null;

  @ApiProperty({ type: MemberDto, nullable: true, description: 'null while they stand.' })
  closedBy: MemberDto | null;

  @ApiProperty({ enum: OFFER_STATES, isArray: true, description: 'What calls for a look at it.' })
  states: OfferState[];

  @ApiProperty({ type: 'integer' })
  version: number;
}

export class OfferListDto extends listOf(OfferResponseDto) {}
