import { ELEMENTARY_CHARGE } from './constants.js';

/**
 * Square of the shot noise density of a direct current, 2·q·|I|.
 *
 * @param current A
 * @returns A²/Hz
 * Source: Schottky 1918.
 */
export function shotPowerDensity(current: number): number {
  return 2 * ELEMENTARY_CHARGE * Math.abs(current);
}
