import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsIn } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

/** One of a vocabulary's words. */
export function Option(values: readonly string[], presence: Presence = {}): PropertyDecorator {
  return applyDecorators(
    ...skipAbsent(presence),
    IsIn(values, { message: `one of these was expected: ${values.join(', ')}` }),
    ApiProperty({
      type: String,
      enum: values,
      required: !presence.optional,
      nullable: presence.nullable,
    }),
  );
}

/** A list of a vocabulary's words; in a query it may also be one text with commas. */
export function Options(
  values: readonly string[],
  { inQuery, least = 0, ...presence }: Presence & { inQuery?: boolean; least?: number } = {},
): PropertyDecorator {
  const list = least > 0 ? `a list of ${least} or more of these` : 'a list of these';
  const message = `${list} was expected: ${values.join(', ')}`;
  return applyDecorators(
    ...skipAbsent(presence),
    ...(inQuery ? [Transform(({ value }) => (typeof value === 'string' ? value.split(',') : value))] : []),
    IsIn(values, { each: true, message }),
    ArrayMaxSize(values.length, { message }),
    ArrayMinSize(least, { message }),
    IsArray({ message }),
    ApiProperty({
      enum: values,
      isArray: true,
      required: !presence.optional,
      nullable: presence.nullable,
      ...(least > 0 && { minItems: least }),
    }),
  );
}
