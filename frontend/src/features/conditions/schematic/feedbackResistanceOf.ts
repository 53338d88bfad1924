import type { OperatingConditions } from '@roothertz/common/conditions';

/** R_f in Ω as it follows from the gain; null where the stage has none or its values are missing. */
export function feedbackResistanceOf({ stage, source }: OperatingConditions): number | null {
  const { topology, gain, gainResistance } = stage;
  if (topology === 'transimpedance' || gain === undefined || gainResistance === undefined) return null;
  switch (topology) {
    case 'inverting':
      return gain * (source.resistance + gainResistance);
    case 'difference':
      return gain * (source.resistance / 2 + gainResistance);
    case 'instrumentation':
      return (gainResistance * (gain - 1)) / 2;
    default:
      return gainResistance * (gain - 1);
  }
}
