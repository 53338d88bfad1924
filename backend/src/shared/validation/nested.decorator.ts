import { applyDecorators, type Type as ClassOf } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsObject, ValidateNested } from 'class-validator';
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
