import { digestWeek } from './digest-week.js';

describe('the week of a digest', () => {
  it.each([
    ['2026-11-30T06:59:59Z', '2026-11-23'],
    ['2026-11-30T07:00:00Z', '2026-11-30'],
    ['2026-12-01T03:00:00Z', '2026-11-30'],
    ['2026-12-06T23:59:59Z', '2026-11-30'],
    ['2026-12-07T06:59:59Z', '2026-11-30'],
    ['2027-01-01T12:00:00Z', '2026-12-28'],
  ])('is at %s that of Monday, %s', (moment, monday) => {
    expect(digestWeek(new Date(moment))).toBe(monday);
  });
});
