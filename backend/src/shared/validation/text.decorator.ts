import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ValidateBy } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

export interface TextOptions extends Presence {
  label: string;
  minLength?: number;
  maxLength: number;
  description?: string;
}

const CONTROL_CHARACTERS = /[\p{Cc}\p{Cs}]/u;

/** A text of limited length without control characters, checked and documented. */
export function Text(options: TextOptions): PropertyDecorator {
  const { minLength = 0, maxLength, nullable, optional, description } = options;
  return applyDecorators(
    ...skipAbsent(options),
    ValidateBy({
      name: 'text',
      validator: {
        validate: (value) => textError(value, options) === null,
        defaultMessage: (args) => textError(args?.value, options) ?? '',
      },
    }),
    ApiProperty({ type: String, minLength, maxLength, nullable, required: !optional, description }),
  );
}

function textError(value: unknown, { label, minLength = 0, maxLength }: TextOptions): string | null {
  if (typeof value !== 'string') return `${label}: a text was expected`;
  if (value.trim().length < minLength) return `${label}: must not be empty`;
  if (value.length > maxLength) return `${label}: at most ${maxLength} characters were expected`;
  return CONTROL_CHARACTERS.test(value) ? `${label}: a text without control characters was expected` : null;
}
