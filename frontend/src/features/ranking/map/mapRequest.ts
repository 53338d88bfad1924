import type { OperatingConditions, PartFilter, RankingRequest } from '@roothertz/common/conditions';
import type { MapRequest } from '../../../api/quietestMap';

/** Five points for each decade of resistance, four for each of frequency. */
const RESISTANCE = { from: 1, to: 10e6, steps: 36 };
const FREQUENCY = { from: 0.1, to: 10e6, steps: 33 };

/**
 * What the map is asked with. Its axes stand in for source resistance, band and reference frequency, which are
 * set alike for all so that moving on the map doesn't ask for it again.
 */
export function mapRequest(conditions: OperatingConditions, filter?: PartFilter): MapRequest {
  return {
    conditions: {
      ...conditions,
      source: { ...conditions.source, resistance: 1000 },
      band: { lower: 1, upper: 10, lowPassOrder: 0 },
      referenceFrequency: 10,
    },
    filter,
    resistance: RESISTANCE,
    frequency: FREQUENCY,
  };
}

/**
 * The conditions moved to a place of the map: source resistance and reference frequency. The band stays where
 * it holds the frequency, and lies around it with the ratio that it had where it doesn't.
 */
export function movedTo(request: RankingRequest, resistance: number, frequency: number): RankingRequest {
  const { conditions } = request;
  const referenceFrequency = rounded(frequency);
  return {
    ...request,
    conditions: {
      ...conditions,
      source: { ...conditions.source, resistance: rounded(resistance) },
      referenceFrequency,
      band: bandAround(conditions.band, referenceFrequency),
    },
  };
}

function bandAround(band: OperatingConditions['band'], frequency: number): OperatingConditions['band'] {
  const { lower, upper } = band;
  if (frequency >= lower && frequency <= upper) return band;
  const half = Math.sqrt(upper / lower);
  return {
    ...band,
    lower: Number((frequency / half).toPrecision(3)),
    upper: Number((frequency * half).toPrecision(3)),
  };
}

/** Two digits say where a cell lies. */
function rounded(value: number): number {
  return Number(value.toPrecision(2));
}
