import { emptyColumns, type AmplifierColumns } from '../../src/noise/index.js';

/** Numbers from 0 to 1 that are the same in every run. */
export function sequence(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 1103515245 + 12345) % 2 ** 31) / 2 ** 31;
}

/** Op-amps with every figure spread evenly in its logarithm; some bandwidths and capacitances are unknown. */
export function randomLibrary(count: number, seed: number): AmplifierColumns {
  const random = sequence(seed);
  const between = (from: number, to: number) => from * (to / from) ** random();
  const columns = emptyColumns(count);
  const { parameters, origins } = columns;
  for (let row = 0; row < count; row++) {
    parameters.voltageNoise[row] = between(0.8e-9, 60e-9);
    parameters.voltageNoiseCorner[row] = between(0.1, 3000);
    parameters.currentNoise[row] = between(1e-16, 5e-12);
    parameters.currentNoiseCorner[row] = between(0.1, 1000);
    if (random() > 0.05) parameters.gainBandwidth[row] = between(1e4, 2e9);
    if (random() > 0.1) parameters.inputCapacitance[row] = between(1e-13, 1e-10);
    origins.voltageNoise[row] = (['typical', 'maximum', 'measured', 'estimated'] as const)[row % 4];
  }
  return columns;
}
