import { CONTRIBUTORS, type Contributions, type Contributor } from '@roothertz/common/noise';

export const BAR_WIDTH = 80;

/** The floor's length where there is room, and the most that the quietest part's bar takes. */
const FLOOR_PART = 0.25;
const QUIETEST_PART = 0.5;

/** Pixels per squared volt (or ampere), the same for all rows: lengths are noise powers over the floor. */
export function barScale(floorRms: number, quietestRms: number): number {
  const byFloor = floorRms > 0 ? (BAR_WIDTH * FLOOR_PART) / floorRms ** 2 : Infinity;
  return Math.min(byFloor, (BAR_WIDTH * QUIETEST_PART) / quietestRms ** 2);
}

export interface BarPiece {
  contributor: Contributor;
  x: number;
  width: number;
}

export interface Bar {
  pieces: BarPiece[];
  /** The bar is longer than its place. */
  overflows: boolean;
}

/** The pieces of a row's budget bar, cut off where its place ends. */
export function barOf(contributions: Contributions, scale: number): Bar {
  const pieces: BarPiece[] = [];
  let x = 0;
  for (const contributor of CONTRIBUTORS) {
    const length = contributions[contributor] ** 2 * scale;
    const width = Math.min(length, BAR_WIDTH - Math.min(x, BAR_WIDTH));
    if (width > 0) pieces.push({ contributor, x, width });
    x += length;
  }
  return { pieces, overflows: x > BAR_WIDTH + 0.5 };
}
