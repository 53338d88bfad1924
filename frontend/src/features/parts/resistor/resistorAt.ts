import {
  excessPowerDensity,
  PARAMETER_TEMPERATURE,
  resistorNoise,
  thermalVoltageDensity,
  type ResistorFigures,
} from '@roothertz/common/noise';
import type { Resistor } from '@roothertz/common/parts';

/** The decade in which thermal and excess noise are compared. */
export const DECADE = { lower: 10, upper: 100, lowPassOrder: 0 };

/** What a resistor makes under a direct voltage at 25 °C. */
export interface ResistorAt extends ResistorFigures {
  dcVoltage: number;
  /** Hz at which the excess noise density equals the thermal one; null where the noise index is unknown. */
  crossover: number | null;
  /** It dissipates more than its rating allows. */
  isOverRating: boolean;
}

export function resistorAt(resistor: Resistor, dcVoltage: number): ResistorAt {
  const { resistance, noiseIndex, powerRating } = resistor;
  const place = {
    resistance,
    resistanceTolerance: 0,
    dcVoltage,
    ambientTemperature: PARAMETER_TEMPERATURE,
    band: DECADE,
  };
  const figures = resistorNoise(place, resistor);
  const thermal = thermalVoltageDensity(resistance, figures.temperature);
  return {
    ...figures,
    dcVoltage,
    crossover: noiseIndex === null ? null : excessPowerDensity(noiseIndex, dcVoltage, 1) / thermal ** 2,
    isOverRating: powerRating !== null && figures.dissipation > powerRating,
  };
}
