import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { ValidateBy, type ValidationArguments } from 'class-validator';
import { Text } from '../../shared/validation/text.decorator.js';
import { passwordFault } from '../password-rules.js';

/** A password as it is given, a new one or one to compare. */
export function Password(label = 'password'): PropertyDecorator {
  return Text({ label, minLength: 1, maxLength: 200 });
}

/** The new password of the account whose address stands beside it. */
export function NewPassword(): PropertyDecorator {
  const validator = {
    validate: (_: unknown, args?: ValidationArguments) => faultOf(args) === null,
    defaultMessage: (args?: ValidationArguments) => faultOf(args) ?? '',
  };
  return applyDecorators(Password(), ValidateBy({ name: 'newPassword', validator }));
}

/** A name of a person or a team, without spaces around it. */
export function Name(label: string): PropertyDecorator {
  return applyDecorators(
    Text({ label, minLength: 1, maxLength: 120 }),
    Transform(({ value }) => (typeof value === 'string' ? value.trim() : value)),
  );
}

function faultOf(args?: ValidationArguments): string | null {
  const { email } = args?.object as { email?: unknown };
  return typeof args?.value === 'string' ? passwordFault(args.value, String(email)) : null;
}
