import { describe, expect, it } from 'vitest';
import { passwordLengthFault } from './index.js';

describe('passwordLengthFault', () => {
  it('takes twelve characters and no fewer, however many bytes they have', () => {
    expect(passwordLengthFault('a'.repeat(11))).toMatch(/At least 12/);
    expect(passwordLengthFault('a'.repeat(12))).toBeNull();
    expect(passwordLengthFault('🔇'.repeat(11))).toMatch(/At least 12/);
    expect(passwordLengthFault('🔇'.repeat(12))).toBeNull();
  });

  it('takes seventy-two bytes and no more', () => {
    expect(passwordLengthFault('a'.repeat(72))).toBeNull();
    expect(passwordLengthFault('a'.repeat(73))).toMatch(/At most 72 bytes/);
    expect(passwordLengthFault('é'.repeat(36))).toBeNull();
    expect(passwordLengthFault('é'.repeat(37))).toMatch(/At most 72 bytes/);
    expect(passwordLengthFault('Ω€🔇'.repeat(9))).toMatch(/At most 72 bytes/);
  });
});
