import { SUPPLIER_NAME } from '@roothertz/common/prices';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';
import type { Supplier } from '../entities/supplier.entity.js';

export class CreateSupplierDto {
  @StoredText(SUPPLIER_NAME)
  name: string;
}

export class SupplierResponseDto {
  @ApiProperty()
  id: string;

  @ApiProperty()
  name: string;
}

export class ListedSupplierDto extends SupplierResponseDto {
  @ApiProperty({
    type: String,
    nullable: true,
    description: 'Of its latest offer (ISO 4217); null = it has made none.',
  })
  currency: string | null;
}

export class SupplierListDto extends listOf(ListedSupplierDto) {}

export function toSupplierResponse({ id, name }: Pick<Supplier, 'id' | 'name'>): SupplierResponseDto {
  return { id: String(id), name };
}
