import { Transform } from 'class-transformer';
import { Text } from '../../shared/validation/text.decorator.js';

export class SignInDto {
  @Text({ label: 'e-mail address', minLength: 1, maxLength: 254 })
  @Transform(({ value }) => (typeof value === 'string' ? value.trim().toLowerCase() : value))
  email: string;

  @Text({ label: 'password', minLength: 1, maxLength: 200 })
  password: string;
}
