import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { Checked } from './checked.decorator.js';

const LONGEST = 254;
const ADDRESS = /^[^\s@<>"(),:;\\[\]\p{C}]{1,64}@[a-z0-9-]+(\.[a-z0-9-]+)*\.[a-z]{2,}$/iu;
const MESSAGE = 'e-mail address: an address such as name@company.example was expected';

/** An e-mail address that messages are sent to, in lower case and without spaces at its ends. */
export function Email(): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }) => (typeof value === 'string' ? value.trim().toLowerCase() : value)),
    Checked((value) => (isAddress(value) ? null : MESSAGE), { format: 'email', maxLength: LONGEST }),
  );
}

function isAddress(value: unknown): boolean {
  return typeof value === 'string' && value.length <= LONGEST && ADDRESS.test(value);
}
