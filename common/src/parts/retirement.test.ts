import { describe, expect, it } from 'vitest';
import { isRetired, isRetiredUnasked, RETIRED } from './retirement.js';

describe('a retired part', () => {
  it('is obsolete and not approved, and neither alone', () => {
    expect(isRetired(RETIRED)).toBe(true);
    expect(isRetired({ ...RETIRED, lifecycle: 'last-time-buy' })).toBe(false);
    expect(isRetired({ ...RETIRED, approval: 'restricted' })).toBe(false);
  });

  it('is left out unless a filter asks for its lifecycle or approval', () => {
    expect(isRetiredUnasked(RETIRED, {})).toBe(true);
    expect(isRetiredUnasked(RETIRED, { lifecycle: [], approval: [] })).toBe(true);
    expect(isRetiredUnasked(RETIRED, { lifecycle: ['obsolete'] })).toBe(false);
    expect(isRetiredUnasked(RETIRED, { approval: ['not-approved'] })).toBe(false);
    expect(isRetiredUnasked({ ...RETIRED, approval: 'approved' }, {})).toBe(false);
  });
});
