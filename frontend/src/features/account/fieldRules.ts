import { passwordLengthFault } from '@roothertz/common/accounts';
import type { FormRule } from 'antd';

/** A value that is needed. */
export function needed(message: string): FormRule[] {
  return [{ required: true, whitespace: true, message }];
}

/** The length of a new password; whether it is a common one the server knows. */
export const NEW_PASSWORD: FormRule[] = [
  {
    validator: (_, value?: string) => {
      const fault = passwordLengthFault(value ?? '');
      return fault === null ? Promise.resolve() : Promise.reject(new Error(fault));
    },
  },
];

export const PASSWORD_HINT =
  'At least 12 characters: three or four words that don’t belong together are good.';
