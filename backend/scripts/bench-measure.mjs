const WARM_UP = 10;

/**
 * Times several tasks in turn, round after round, so that all of them meet the same machine. A task that answers a
 * number has timed itself, in ms.
 * @param {number} rounds
 * @param {Record<string, () => Promise<number | void> | number | void>} tasks
 */
export async function interleaved(rounds, tasks) {
  const times = Object.fromEntries(Object.keys(tasks).map((name) => [name, []]));
  for (let round = -WARM_UP; round < rounds; round += 1) {
    for (const [name, task] of Object.entries(tasks)) {
      const began = performance.now();
      const own = await task();
      const time = own ?? performance.now() - began;
      if (round >= 0) times[name].push(time);
    }
  }
  return times;
}

export function median(times) {
  return quantile(times, 0.5);
}

export function quantile(times, share) {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))];
}
