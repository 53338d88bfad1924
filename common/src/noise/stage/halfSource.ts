import type { SourceConditions } from '../../conditions/index.js';

/** One leg of a source that is split equally about ground: half of its impedance, and so twice its capacitance. */
export function halfSource(source: SourceConditions): SourceConditions {
  return {
    ...source,
    resistance: source.resistance / 2,
    inductance: source.inductance / 2,
    capacitance: source.capacitance * 2,
  };
}
