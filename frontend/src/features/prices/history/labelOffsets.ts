/** Pixels from one line of text to the next. */
const LINE = 15;
/** An axis with round ends gives the values at least so much of its height. */
const LEAST_SHARE = 0.6;

/**
 * By how many pixels the names at the ends of lines have to be moved down so that none covers another.
 *
 * @param values at which the lines end
 * @param height of the plot in pixels
 */
export function labelOffsets(values: readonly number[], height: number): number[] {
  const [least, most] = [Math.min(...values), Math.max(...values)];
  const scale = most > least ? (height * LEAST_SHARE) / (most - least) : 0;
  const offsets = values.map(() => 0);
  const fromTop = values.map((value, index) => ({ index, at: (most - value) * scale }));
  fromTop.sort((a, b) => a.at - b.at || a.index - b.index);
  let free = -Infinity;
  for (const { index, at } of fromTop) {
    offsets[index] = Math.max(0, free - at);
    free = Math.max(at, free) + LINE;
  }
  return offsets;
}
