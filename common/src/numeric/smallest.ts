/**
 * The positions of the `count` smallest keys, in ascending order of key; equal keys in ascending order of
 * position. Keys that are NaN come last.
 *
 * Quickselect narrows the positions to the wanted ones before they are sorted, so that a page of a
 * hundred thousand keys costs one pass and not a full sort.
 *
 * @param keys the keys
 * @param count how many are wanted; more than there are = all
 */
export function smallestPositions(keys: Float64Array, count: number): Uint32Array {
  const comparable = new Float64Array(keys.length);
  const positions = new Uint32Array(keys.length);
  for (let i = 0; i < keys.length; i++) {
    comparable[i] = Number.isNaN(keys[i]) ? Infinity : keys[i];
    positions[i] = i;
  }
  const wanted = Math.min(count, keys.length);
  if (wanted > 0 && wanted < keys.length) select(comparable, positions, wanted - 1);
  return positions
    .subarray(0, wanted)
    .sort((a, b) => (comparable[a] < comparable[b] ? -1 : comparable[a] > comparable[b] ? 1 : a - b));
}

function select(keys: Float64Array, positions: Uint32Array, target: number): void {
  let low = 0;
  let high = positions.length - 1;
  while (low < high) {
    const pivot = positions[(low + high) >> 1];
    const [lower, upper] = partition(keys, positions, low, high, pivot);
    if (target <= upper) high = upper;
    else if (target >= lower) low = lower;
    else return;
  }
}

function partition(
  keys: Float64Array,
  positions: Uint32Array,
  low: number,
  high: number,
  pivot: number,
): [lower: number, upper: number] {
  const pivotKey = keys[pivot];
  const before = (position: number) =>
    keys[position] < pivotKey || (keys[position] === pivotKey && position < pivot);
  const after = (position: number) =>
    keys[position] > pivotKey || (keys[position] === pivotKey && position > pivot);
  let i = low;
  let j = high;
  while (i <= j) {
    while (before(positions[i])) i++;
    while (after(positions[j])) j--;
    if (i > j) break;
    const moved = positions[i];
    positions[i++] = positions[j];
    positions[j--] = moved;
  }
  return [i, j];
}
