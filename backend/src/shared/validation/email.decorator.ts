import { ADDRESS_MOST, addressFault } from '@roothertz/common/accounts';
import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { Checked } from './checked.decorator.js';

/** An e-mail address that messages are sent to, in lower case and without spaces at its ends. */
export function Email(): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }) => (typeof value === 'string' ? value.trim().toLowerCase() : value)),
    Checked((value) => addressFault(typeof value === 'string' ? value : ''), {
      format: 'email',
      maxLength: ADDRESS_MOST,
    }),
  );
}
