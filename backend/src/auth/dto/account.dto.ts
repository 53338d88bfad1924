import { Name, NewPassword, Password } from './account-fields.js';
import { Email } from '../../shared/validation/email.decorator.js';
import { Text } from '../../shared/validation/text.decorator.js';
import { Id } from '../../shared/validation/id.decorator.js';

export class SignUpDto {
  @Name('name')
  name: string;

  @Email()
  email: string;

  @NewPassword()
  password: string;

  @Name('name of the team')
  teamName: string;
}

export class EmailDto {
  @Email()
  email: string;
}

export class TokenDto {
  @Text({ label: 'token', minLength: 1, maxLength: 100 })
  token: string;
}

export class ResetPasswordDto extends TokenDto {
  @Password()
  password: string;
}

export class RenameAccountDto {
  @Name('name')
  name: string;
}

export class ChangePasswordDto {
  @Password('current password')
  currentPassword: string;

  @Password('new password')
  newPassword: string;
}

export class ChangeAddressDto extends EmailDto {
  @Password()
  password: string;
}

export class CloseAccountDto {
  @Password()
  password: string;
}

export class SwitchTeamDto {
  @Id()
  teamId: string;
}
