/** What entries are handed out by: the first number, where that is equal the second. */
export type Key = readonly [number, number];

/** Hands out entries in ascending order of their keys, equal keys in the order in which they were added. */
export class PriorityQueue<Entry> {
  private readonly heap: { key: Key; turn: number; entry: Entry }[] = [];
  private turns = 0;

  add(key: Key, entry: Entry): void {
    this.heap.push({ key, turn: this.turns++, entry });
    let child = this.heap.length - 1;
    while (child > 0) {
      const parent = (child - 1) >> 1;
      if (!this.isBefore(child, parent)) return;
      this.swap(child, parent);
      child = parent;
    }
  }

  /** Takes out the entry with the least key; undefined when none is left. */
  take(): Entry | undefined {
    if (this.heap.length === 0) return undefined;
    this.swap(0, this.heap.length - 1);
    const { entry } = this.heap.pop()!;
    this.sink();
    return entry;
  }

  private sink(): void {
    for (let parent = 0; ;) {
      const [left, right] = [2 * parent + 1, 2 * parent + 2];
      const child = right < this.heap.length && this.isBefore(right, left) ? right : left;
      if (child >= this.heap.length || !this.isBefore(child, parent)) return;
      this.swap(child, parent);
      parent = child;
    }
  }

  private isBefore(a: number, b: number): boolean {
    const [one, other] = [this.heap[a], this.heap[b]];
    return difference(one.key, other.key, one.turn - other.turn) < 0;
  }

  private swap(a: number, b: number): void {
    [this.heap[a], this.heap[b]] = [this.heap[b], this.heap[a]];
  }
}

function difference(one: Key, other: Key, ofTurns: number): number {
  if (one[0] !== other[0]) return one[0] < other[0] ? -1 : 1;
  if (one[1] !== other[1]) return one[1] < other[1] ? -1 : 1;
  return ofTurns;
}
