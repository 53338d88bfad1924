import { CAUTION_DETAILS, type Caution } from '@roothertz/common/noise';
import type { Amplifier, OpAmpParameterKey } from '@roothertz/common/parts';

const MISSING: readonly [OpAmpParameterKey, Caution][] = [
  ['currentNoise', 'current-noise-unknown'],
  ['voltageNoiseCorner', 'corner-unknown'],
  ['currentNoiseCorner', 'corner-unknown'],
  ['gainBandwidth', 'bandwidth-unknown'],
  ['inputCapacitance', 'capacitance-unknown'],
  ['minimumStableGain', 'stability-unknown'],
  ['supplyMinimum', 'supply-unknown'],
  ['supplyMaximum', 'supply-unknown'],
];

/** What the op-amp's unknown figures mean for a ranking, in words. */
export function opAmpCautions(amplifier: Amplifier): string[] {
  const cautions = MISSING.filter(([key]) => amplifier[key] === null).map(([, caution]) => caution);
  return [...new Set(cautions)].map((caution) => CAUTION_DETAILS[caution]);
}
