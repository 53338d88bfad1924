import { LIBRARIES, type Library, PART_KINDS, type PartKind } from '@roothertz/common/parts';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { ListQueryDto } from '../../shared/list/list-query.dto.js';
import { QueryFlag } from '../../shared/validation/flag.decorator.js';
import { Id } from '../../shared/validation/id.decorator.js';
import { Options } from '../../shared/validation/option.decorator.js';
import { PRICE_STATES, type PriceState } from '../price-select.js';
import { OfferedPartDto, OfferResponseDto } from './offer-response.dto.js';

const IN_QUERY = { optional: true, inQuery: true };

/**
 * What narrows the grid. Without a state it holds every offer that stands; where it is narrowed to a part or
 * to the parts in use, also those of them without one.
 */
export class ListPricesDto extends ListQueryDto {
  @Options(PRICE_STATES, IN_QUERY)
  state?: PriceState[];

  @Options(LIBRARIES, IN_QUERY)
  library?: Library[];

  @Options(PART_KINDS, IN_QUERY)
  kind?: PartKind[];

  @Id({ optional: true })
  partId?: string;

  @Id({ optional: true })
  supplierId?: string;

  @QueryFlag('Only parts that are chosen in saved conditions.')
  usedInConditions?: boolean;
}

export class PriceRowResponseDto {
  @ApiProperty()
  part: OfferedPartDto;

  @ApiProperty({ type: OfferResponseDto, nullable: true, description: 'null where the part has no offer.' })
  offer: OfferResponseDto | null;

  @ApiProperty({ type: [String], description: 'Names of the saved conditions in which the part is chosen.' })
  usedIn: string[];
}

export class PriceListDto extends listOf(PriceRowResponseDto) {}
