import { OFFER_FIELDS } from '@roothertz/common/prices';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { Currency } from './offer-terms.dto.js';

export class PriceSettingsDto {
  @Currency()
  currency: string;

  @Quantity(OFFER_FIELDS.staleAfterDays)
  staleAfterDays: number;
}
