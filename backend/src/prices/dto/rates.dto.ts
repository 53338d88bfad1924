import { readRate } from '@roothertz/common/prices';
import { ApiProperty } from '@nestjs/swagger';
import { Checked } from '../../shared/validation/checked.decorator.js';
import { Day } from '../../shared/validation/day.decorator.js';
import { NestedList } from '../../shared/validation/nested.decorator.js';
import { Currency } from './offer-terms.dto.js';

const MOST_RATES = 200;

function rateError(value: unknown): string | null {
  if (typeof value !== 'string') return 'rate: a decimal number as a text was expected';
  const reading = readRate(value);
  return reading.ok ? null : reading.message;
}

export class RateDto {
  @Currency()
  currency: string;

  @Checked(rateError, { description: 'A unit of the currency in the team’s currency, up to eight decimals.' })
  rate: string;
}

export class SaveRatesDto {
  /** Left out = today. */
  @Day('dated', { optional: true })
  dated?: string;

  @NestedList(() => RateDto, { most: MOST_RATES })
  rates: RateDto[];
}

export class DatedRateDto {
  @ApiProperty({ description: 'ISO 4217' })
  currency: string;

  @ApiProperty({ description: 'Decimal number: a unit of the currency in the team’s currency.' })
  rate: string;

  @ApiProperty({ type: String, format: 'date', description: 'From when on it holds.' })
  dated: string;
}

export class RatesResponseDto {
  @ApiProperty({ description: 'The team’s currency (ISO 4217).' })
  currency: string;

  @ApiProperty({ type: [DatedRateDto], description: 'The rates that hold today.' })
  items: DatedRateDto[];

  @ApiProperty({ type: [String], description: 'Currencies of offers that don’t count for want of a rate.' })
  missing: string[];
}
