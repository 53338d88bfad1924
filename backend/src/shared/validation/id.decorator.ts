import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ArrayMaxSize, ArrayMinSize, IsArray, ValidateBy } from 'class-validator';
import { readId } from '../ids/read-id.js';
import { Checked } from './checked.decorator.js';
import type { Presence } from './presence.js';

const MESSAGE = 'an id as an answer gave it was expected';

/** The id of an object in a body or a query. */
export function Id(presence?: Presence): PropertyDecorator {
  return Checked((value) => (isId(value) ? null : MESSAGE), {}, presence);
}

/** A list of ids. */
export function Ids(most: number): PropertyDecorator {
  const message = `a list of 1 to ${most} ids was expected`;
  return applyDecorators(
    ValidateBy({ name: 'ids', validator: { validate: isId } }, { each: true, message }),
    ArrayMaxSize(most, { message }),
    ArrayMinSize(1, { message }),
    IsArray({ message }),
    ApiProperty({ type: [String], minItems: 1, maxItems: most }),
  );
}

function isId(value: unknown): boolean {
  return typeof value === 'string' && readId(value) !== null;
}
