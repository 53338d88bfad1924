/** The radius of a disc that stands for the whole noise. */
export const WHOLE_RADIUS = 22;

/** The radius of a noise generator's disc in pixels: its area goes with its share of the noise power, 0 to 1. */
export function discRadius(share: number): number {
  return WHOLE_RADIUS * Math.sqrt(Math.min(1, Math.max(0, share)));
}
