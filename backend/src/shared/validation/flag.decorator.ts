import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsBoolean } from 'class-validator';
import { skipAbsent } from './presence.js';

const WORDS: Record<string, boolean> = { true: true, false: false };

/** Yes or no in a query, which may be left out. */
export function QueryFlag(description: string): PropertyDecorator {
  return applyDecorators(
    ...skipAbsent({ optional: true }),
    Transform(({ value }) => WORDS[String(value)] ?? value),
    IsBoolean({ message: 'true or false was expected' }),
    ApiProperty({ type: Boolean, required: false, description }),
  );
}
