import { applyDecorators } from '@nestjs/common';
import { ApiProperty, type ApiPropertyOptions } from '@nestjs/swagger';
import { ValidateBy } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

/**
 * A text that a check of the catalogue or of common accepts, checked and documented.
 *
 * @param errorOf what is wrong with a value, in words, or null
 */
export function Checked(
  errorOf: (value: unknown) => string | null,
  description: ApiPropertyOptions,
  presence: Presence = {},
): PropertyDecorator {
  return applyDecorators(
    ...skipAbsent(presence),
    ValidateBy({
      name: 'checked',
      validator: {
        validate: (value) => errorOf(value) === null,
        defaultMessage: (args) => errorOf(args?.value) ?? '',
      },
    }),
    ApiProperty({
      type: String,
      required: !presence.optional,
      nullable: presence.nullable,
      ...description,
    } as ApiPropertyOptions),
  );
}
