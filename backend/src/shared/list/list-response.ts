import type { Type } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';

export interface List<Item> {
  items: Item[];
  /** How many there are in all, whatever the page holds. */
  total: number;
}

/** The class of a page of items, for OpenAPI: `class OpAmpListDto extends listOf(OpAmpResponseDto) {}`. */
export function listOf<Item>(item: Type<Item>): Type<List<Item>> {
  class ListDto implements List<Item> {
    @ApiProperty({ type: [item] })
    items: Item[];

    @ApiProperty({ type: 'integer', description: 'How many there are in all, whatever the page holds.' })
    total: number;
  }
  return ListDto;
}
