import { readText, type TextField } from '@roothertz/common/parts';
import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { ValidateBy } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

/** A text of a catalogue's field in the form in which it is stored, checked and documented. */
export function StoredText(field: TextField, presence: Presence = {}): PropertyDecorator {
  const { required, maxLength } = field;
  return applyDecorators(
    ...skipAbsent(presence),
    Transform(({ value }) => storedForm(field, value)),
    ValidateBy({
      name: 'storedText',
      validator: {
        validate: (value) => textError(field, value) === null,
        defaultMessage: (args) => textError(field, args?.value) ?? '',
      },
    }),
    ApiProperty({ type: String, minLength: required ? 1 : 0, maxLength, required: !presence.optional }),
  );
}

function storedForm(field: TextField, value: unknown): unknown {
  if (typeof value !== 'string') return value;
  const reading = readText(field, value);
  return reading.ok ? reading.value : value;
}

function textError(field: TextField, value: unknown): string | null {
  if (typeof value !== 'string') return `${field.label}: a text was expected`;
  const reading = readText(field, value);
  return reading.ok ? null : reading.message;
}
