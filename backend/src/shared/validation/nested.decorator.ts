import { applyDecorators, type Type as ClassOf } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsObject, ValidateNested } from 'class-validator';
import { type Presence, skipAbsent } from './presence.js';

/** An object of another class, checked in its turn and documented. */
export function Nested(type: () => ClassOf, presence: Presence = {}): PropertyDecorator {
  return applyDecorators(
    ...skipAbsent(presence),
    ValidateNested(),
    IsObject({ message: 'an object was expected' }),
    Type(type),
    ApiProperty({ type: () => type(), required: !presence.optional, nullable: presence.nullable }),
  );
}

/** A list of objects of another class, each checked in its turn and documented. */
export function NestedList(
  type: () => ClassOf,
  { most, ...presence }: Presence & { most: number },
): PropertyDecorator {
  const message = `a list of 1 to ${most} objects was expected`;
  return applyDecorators(
    ...skipAbsent(presence),
    ValidateNested({ each: true }),
    ArrayMaxSize(most, { message }),
    ArrayMinSize(1, { message }),
    IsObject({ each: true, message }),
    IsArray({ message }),
    Type(type),
    ApiProperty({
      type: () => type(),
      isArray: true,
      minItems: 1,
      maxItems: most,
      required: !presence.optional,
    }),
  );
}
