/** Whole decades around some positive values; one decade where there are none. */
export function decadesAround(values: readonly number[]): [number, number] {
  const positive = values.filter((value) => value > 0 && Number.isFinite(value));
  if (positive.length === 0) return [0.1, 1];
  const low = Math.floor(Math.log10(Math.min(...positive)) + 1e-9);
  const high = Math.ceil(Math.log10(Math.max(...positive)) - 1e-9);
  return [Number(`1e${low}`), Number(`1e${Math.max(high, low + 1)}`)];
}

/** Values in even steps of the logarithm, the ends included. */
export function logSteps(from: number, to: number, perDecade: number): number[] {
  const steps = Math.max(1, Math.round(Math.log10(to / from) * perDecade));
  return Array.from({ length: steps + 1 }, (_none, step) => from * (to / from) ** (step / steps));
}
