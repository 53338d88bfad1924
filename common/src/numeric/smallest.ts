/**
 * The positions of the `count` smallest keys, in ascending order of key; equal keys in ascending order of
 * position. Keys that are NaN count as Infinity.
 *
 * A heap of the smallest keys so far has the largest of them on top: a page of a hundred thousand keys costs
 * little more than a comparison a key.
 *
 * @param keys the keys
 * @param count how many are wanted; more than there are = all
 */
export function smallestPositions(keys: Float64Array, count: number): Uint32Array {
  const heap = Uint32Array.from({ length: Math.min(count, keys.length) }, (_, position) => position);
  for (let parent = (heap.length >> 1) - 1; parent >= 0; parent--) sink(keys, heap, parent);
  for (let position = heap.length; position < keys.length && heap.length > 0; position++) {
    if (!isAfter(keys, heap[0], position)) continue;
    heap[0] = position;
    sink(keys, heap, 0);
  }
  return heap.sort((a, b) => (isAfter(keys, a, b) ? 1 : -1));
}

function isAfter(keys: Float64Array, one: number, other: number): boolean {
  const a = comparable(keys[one]);
  const b = comparable(keys[other]);
  return a > b || (a === b && one > other);
}

function comparable(key: number): number {
  return Number.isNaN(key) ? Infinity : key;
}

/** Moves the entry at a place of the heap down to where none below it is larger. */
function sink(keys: Float64Array, heap: Uint32Array, place: number): void {
  const moved = heap[place];
  let parent = place;
  for (let child = 2 * parent + 1; child < heap.length; child = 2 * parent + 1) {
    if (child + 1 < heap.length && isAfter(keys, heap[child + 1], heap[child])) child++;
    if (!isAfter(keys, heap[child], moved)) break;
    heap[parent] = heap[child];
    parent = child;
  }
  heap[parent] = moved;
}
