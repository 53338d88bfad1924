import { MOST_BREAKS, MOST_OFFERS_SAVED } from '@roothertz/common/prices';
import { OmitType } from '@nestjs/swagger';
import { Id, Ids } from '../../shared/validation/id.decorator.js';
import { NestedList } from '../../shared/validation/nested.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';
import { Currency, OfferTermsDto, PriceBreakDto } from './offer-terms.dto.js';

export class CreateOfferDto extends OmitType(OfferTermsDto, ['currency', 'breaks']) {
  @Id()
  partId: string;

  @Id()
  supplierId: string;

  @Currency()
  currency: string;

  @NestedList(() => PriceBreakDto, { most: MOST_BREAKS })
  breaks: PriceBreakDto[];
}

export class UpdateOfferDto extends OfferTermsDto {
  @Version()
  version: number;
}

/** A row of the grid: a change of the offer `id` at its `version`, or else a new offer for a part. */
export class PriceRowDto extends OfferTermsDto {
  @Id({ optional: true })
  id?: string;

  @Version({ optional: true })
  version?: number;

  @Id({ optional: true })
  partId?: string;

  @Id({ optional: true })
  supplierId?: string;
}

export class SavePricesDto {
  @NestedList(() => PriceRowDto, { most: MOST_OFFERS_SAVED })
  rows: PriceRowDto[];
}

export class ConfirmOffersDto {
  @Ids(MOST_OFFERS_SAVED)
  ids: string[];
}
