import { describe, expect, it } from 'vitest';
import { addressFault } from './index.js';

describe('addressFault', () => {
  it.each(['ada@weir.example', 'ada.m+parts@lab.weir.example', 'ADA@WEIR.EXAMPLE', 'jörg@weir.example'])(
    'takes %s',
    (address) => {
      expect(addressFault(address)).toBeNull();
    },
  );

  it.each([
    '',
    'nobody',
    'a@b',
    '@weir.example',
    'a b@weir.example',
    'a@weir..example',
    'Ada <ada@weir.example>',
  ])('refuses “%s”', (address) => {
    expect(addressFault(address)).toMatch(/such as name@company.example/);
  });

  it('refuses what is longer than any mailbox', () => {
    expect(addressFault(`a@${'x'.repeat(250)}.example`)).not.toBeNull();
  });
});
