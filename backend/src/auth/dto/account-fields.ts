import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { Text } from '../../shared/validation/text.decorator.js';

/** A password as it is given, a new one or one to compare. */
export function Password(label = 'password'): PropertyDecorator {
  return Text({ label, minLength: 1, maxLength: 200 });
}

/** A name of a person or a team, without spaces around it. */
export function Name(label: string): PropertyDecorator {
  return applyDecorators(
    Text({ label, minLength: 1, maxLength: 120 }),
    Transform(({ value }) => (typeof value === 'string' ? value.trim() : value)),
  );
}
