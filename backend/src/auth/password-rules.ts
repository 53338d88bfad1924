import { passwordLengthFault } from '@roothertz/common/accounts';
import { dictionary } from '@zxcvbn-ts/language-common';
import { DomainError } from '../shared/errors/domain-error.js';

const COMMON = new Set(dictionary['passwords-common']);

/** What keeps a new password from being taken, as a sentence; null = nothing. */
export function passwordFault(password: string, email: string): string | null {
  const length = passwordLengthFault(password);
  if (length !== null) return length;
  const lowered = password.toLowerCase();
  if (lowered === email.toLowerCase()) return 'The password must not be the e-mail address.';
  return COMMON.has(lowered) ? 'This is one of the passwords that everybody tries first.' : null;
}

/** @throws naming the field that holds the password */
export function assertPassword(password: string, email: string, field: string): void {
  const message = passwordFault(password, email);
  if (message !== null) throw fieldError(field, message);
}

/** What can't be accepted in one field of an account. */
export function fieldError(field: string, message: string): DomainError {
  return new DomainError('account.invalid', message, { errors: [{ field, message }] });
}
