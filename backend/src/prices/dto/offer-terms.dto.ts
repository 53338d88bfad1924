import {
  currencyError,
  MOST_BREAKS,
  OFFER_FIELDS,
  type PriceBreak,
  priceText,
  readPrice,
  SUPPLIER_NUMBER,
} from '@roothertz/common/prices';
import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { Checked } from '../../shared/validation/checked.decorator.js';
import { Day } from '../../shared/validation/day.decorator.js';
import { NestedList } from '../../shared/validation/nested.decorator.js';
import type { Presence } from '../../shared/validation/presence.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';

/** The code of a currency. */
export function Currency(presence?: Presence): PropertyDecorator {
  return Checked(currencyError, { description: 'ISO 4217', pattern: '^[A-Z]{3}$' }, presence);
}

function UnitPrice(): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }) => (priceError(value) === null ? priceText(String(value).trim()) : value)),
    Checked(priceError, { description: 'Decimal number above 0 with a full stop, up to four decimals.' }),
  );
}

function priceError(value: unknown): string | null {
  if (typeof value !== 'string') return 'unit price: a decimal number as a text was expected';
  const reading = readPrice(value);
  return reading.ok ? null : reading.message;
}

export class PriceBreakDto implements PriceBreak {
  @Quantity(OFFER_FIELDS.minimumQuantity)
  minimumQuantity: number;

  @UnitPrice()
  unitPrice: string;
}

/** The terms of an offer as a change states them: what is left out stays, or has its default where it is new. */
export class OfferTermsDto {
  @StoredText(SUPPLIER_NUMBER, { optional: true })
  supplierNumber?: string;

  @Currency({ optional: true })
  currency?: string;

  @NestedList(() => PriceBreakDto, { most: MOST_BREAKS, optional: true })
  breaks?: PriceBreakDto[];

  @Quantity(OFFER_FIELDS.minimumOrderQuantity, { optional: true })
  minimumOrderQuantity?: number;

  @Quantity(OFFER_FIELDS.orderMultiple, { optional: true })
  orderMultiple?: number;

  @Quantity(OFFER_FIELDS.leadTimeDays, { optional: true, nullable: true })
  leadTimeDays?: number | null;

  @Quantity(OFFER_FIELDS.stock, { optional: true, nullable: true })
  stock?: number | null;

  @Day('valid from', { optional: true })
  validFrom?: string;

  @Day('valid until', { optional: true, nullable: true })
  validUntil?: string | null;
}
