import { CONTRIBUTORS, type Contributions } from '@roothertz/common/noise';

/** Each contributor's share of the noise power, 0 to 1; all 0 where there is no noise. */
export function sharesOf(contributions: Contributions): Contributions {
  const power = CONTRIBUTORS.reduce((sum, contributor) => sum + contributions[contributor] ** 2, 0);
  return Object.fromEntries(
    CONTRIBUTORS.map((contributor) => [contributor, power > 0 ? contributions[contributor] ** 2 / power : 0]),
  ) as Contributions;
}

/** A share in percent as it is read: `71 %`, `0.4 %`, `<0.1 %`. */
export function percentText(share: number): string {
  const percent = 100 * share;
  if (percent >= 0.95) return `${Math.round(percent)}\u2009%`;
  return percent >= 0.1 ? `${percent.toFixed(1)}\u2009%` : '<0.1\u2009%';
}
