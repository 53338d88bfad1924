import type { OperatingConditions } from '../../conditions/index.js';
import type { NoiseAmplifier } from '../amplifierNoise.js';
import { stageAmplifier } from '../stageAmplifier.js';

/**
 * Source resistance in Ω at which an amplifier's noise figure is least, e_n/i_n at the reference frequency; in an
 * instrumentation stage, whose two inputs make √2·e_n and i_n/√2 of the source, 2·e_n/i_n. Infinity where the
 * current noise is zero.
 *
 * Source: Rothe & Dahlke 1956.
 */
export function optimumSourceResistance(conditions: OperatingConditions, amplifier: NoiseAmplifier): number {
  const { voltage2, voltageCorner, current2, currentCorner } = stageAmplifier(conditions, amplifier);
  const { referenceFrequency, stage } = conditions;
  const inputs = stage.topology === 'instrumentation' ? 2 : 1;
  return (
    inputs *
    Math.sqrt(
      (voltage2 * (1 + voltageCorner / referenceFrequency)) /
        (current2 * (1 + currentCorner / referenceFrequency)),
    )
  );
}

/**
 * The conditions behind an ideal step-up transformer 1:N (no resistance, no stray inductance, no noise of
 * its own): R and L of the source times N², its C over N². What is referred to the source there is N
 * times as large as in front of the transformer.
 *
 * Source: Motchenbacher & Connelly 1993, transformer coupling.
 */
export function behindTransformer(conditions: OperatingConditions, ratio: number): OperatingConditions {
  const { source } = conditions;
  return {
    ...conditions,
    source: {
      ...source,
      resistance: source.resistance * ratio ** 2,
      inductance: source.inductance * ratio ** 2,
      capacitance: source.capacitance / ratio ** 2,
    },
  };
}
