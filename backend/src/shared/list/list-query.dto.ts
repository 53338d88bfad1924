import { ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, Max, Min } from 'class-validator';
import { Text } from '../validation/text.decorator.js';

const LIMIT = 'limit: a whole number from 1 to 1000 was expected';
const OFFSET = 'offset: a whole number from 0 was expected';

/** What every list takes; a list's own query extends it. */
export class ListQueryDto {
  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: 1000, default: 50 })
  @Type(() => Number)
  @Max(1000, { message: LIMIT })
  @Min(1, { message: LIMIT })
  @IsInt({ message: LIMIT })
  limit = 50;

  @ApiPropertyOptional({ type: 'integer', minimum: 0, default: 0 })
  @Type(() => Number)
  @Max(1_000_000_000, { message: OFFSET })
  @Min(0, { message: OFFSET })
  @IsInt({ message: OFFSET })
  offset = 0;

  @Text({ label: 'sort', maxLength: 60, optional: true, description: 'A leading minus = descending.' })
  sort?: string;

  @Text({ label: 'search', maxLength: 200, optional: true })
  search?: string;
}
