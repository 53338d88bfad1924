import { MOST_SEATS } from '@roothertz/common/access';
import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsInt, Max, Min } from 'class-validator';
import { MoneyDto } from './billing-response.dto.js';

const LAST_MOMENT = 4_102_444_800;

/** A whole number within bounds, checked and documented. */
function Whole(label: string, minimum: number, maximum: number): PropertyDecorator {
  const message = `${label}: a whole number from ${minimum} to ${maximum} was expected`;
  return applyDecorators(
    Max(maximum, { message }),
    Min(minimum, { message }),
    IsInt({ message }),
    ApiProperty({ type: 'integer', minimum, maximum }),
  );
}

export class SeatsDto {
  @Whole('seats', 1, MOST_SEATS)
  seats: number;
}

export class ChangeSeatsDto extends SeatsDto {
  /** As the preview gave it. */
  @Whole('prorationDate', 0, LAST_MOMENT)
  prorationDate: number;
}

export class SeatPreviewDto extends ChangeSeatsDto {
  @ApiProperty({ description: 'What is charged at once; below zero = credited to the next invoices.' })
  dueNow: MoneyDto;

  @ApiProperty({ description: 'What each month costs from then on.' })
  monthly: MoneyDto;
}

/** Where to go on, at the payment service. */
export class BillingPageDto {
  @ApiProperty()
  url: string;
}
