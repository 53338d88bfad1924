import type { OperatingConditions } from '@roothertz/common/conditions';

/** The source's temperature in K: the ambient one where it has none of its own. */
export function sourceTemperature({ source, ambientTemperature }: OperatingConditions): number {
  return source.temperature ?? ambientTemperature;
}
