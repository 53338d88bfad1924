import { describe, expect, it } from 'vitest';
import { exampleRequest } from './exampleRequest';
import { withBand } from './withBand';

const before = exampleRequest('non-inverting');
const conditionsIn = (from: number, to: number) => withBand(before, { from, to }).conditions;

describe('another band', () => {
  it('keeps the reference frequency that lies in it', () => {
    const { referenceFrequency } = before.conditions;
    expect(conditionsIn(referenceFrequency / 3, referenceFrequency * 2)).toMatchObject({
      band: { lower: referenceFrequency / 3, upper: referenceFrequency * 2 },
      referenceFrequency,
    });
  });

  it('moves the reference frequency to its middle otherwise', () => {
    expect(conditionsIn(2e6, 2e9).referenceFrequency).toBe(63e6);
    expect(conditionsIn(1.0001e6, 1.0002e6).referenceFrequency).toBeCloseTo(1.00015e6, -1);
  });
});
