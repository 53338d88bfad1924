import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ArrayMaxSize, ArrayMinSize, IsArray, ValidateBy } from 'class-validator';
import { readId } from '../ids/read-id.js';
import { Checked } from './checked.decorator.js';
import { type Presence, skipAbsent } from './presence.js';

const MESSAGE = 'an id as an answer gave it was expected';

/** The id of an object in a body or a query. */
export function Id(presence?: Presence): PropertyDecorator {
  return Checked((value) => (isId(value) ? null : MESSAGE), {}, presence);
}

/** A list of ids. */
export function Ids(
  most: number,
  { least = 1, ...presence }: Presence & { least?: number } = {},
): PropertyDecorator {
  const message = `a list of ${least} to ${most} ids was expected`;
  return applyDecorators(
    ...skipAbsent(presence),
    ValidateBy({ name: 'ids', validator: { validate: isId } }, { each: true, message }),
    ArrayMaxSize(most, { message }),
    ArrayMinSize(least, { message }),
    IsArray({ message }),
    ApiProperty({ type: [String], minItems: least, maxItems: most, required: !presence.optional }),
  );
}

function isId(value: unknown): boolean {
  return typeof value === 'string' && readId(value) !== null;
}
