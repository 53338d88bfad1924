import { addressFault, passwordLengthFault } from '@roothertz/common/accounts';
import type { FormRule } from 'antd';

/** A value that is needed. */
export function needed(message: string): FormRule[] {
  return [{ required: true, whitespace: true, message }];
}

/** An e-mail address. */
export const ADDRESS: FormRule[] = checked((value) => addressFault(value.trim()));

/** The length of a new password; whether it is a common one the server knows. */
export const NEW_PASSWORD: FormRule[] = checked(passwordLengthFault);

/** A rule of common's own. */
function checked(faultOf: (value: string) => string | null): FormRule[] {
  const validator = (_: unknown, value?: string) => {
    const fault = faultOf(value ?? '');
    return fault === null ? Promise.resolve() : Promise.reject(new Error(fault));
  };
  return [{ validator }];
}

export const PASSWORD_HINT =
  'At least 12 characters: three or four words that don’t belong together are good.';
