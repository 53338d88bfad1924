import type { Caution } from '@roothertz/common/noise';

/** Cautions that the conditions bring, the same for every part: they don't tell rows apart. */
const OF_THE_STAGE: readonly Caution[] = ['estimated-at-temperature', 'feedback-network-loads-output'];

/** The cautions that belong to the part itself. */
export function cautionsOfPart(cautions: readonly Caution[]): Caution[] {
  return cautions.filter((caution) => !OF_THE_STAGE.includes(caution));
}
