import type { BandConditions, ResistorConditions } from '../../conditions/index.js';
import type { Resistor } from '../../parts/index.js';
import { flickerNoiseBandwidth } from '../band.js';
import { sourceFloor } from '../evaluateStage.js';
import { excessNoiseRms } from '../excess.js';
import { resistorCautions, type ResistorCaution } from './resistorCautions.js';

/** The noise of one resistor at its place. */
export interface ResistorFigures {
  /** V over the band, at the resistor's own temperature */
  thermalRms: number;
  /** V over the band; null where the noise index is unknown */
  excessRms: number | null;
  /** V over the band; without the excess noise where that is unknown */
  totalRms: number;
  /** dB of the total above the thermal noise */
  aboveThermal: number;
  /** W */
  dissipation: number;
  /** K of the resistor itself: ambient, and its own heating where its temperature rise is known */
  temperature: number;
  cautions: ResistorCaution[];
}

/** Thermal noise over the band of one ohm at a temperature in K, in V. */
export type OhmNoise = (temperature: number) => number;

/** The thermal noise of one ohm over a band at a temperature, with Planck's factor where it matters; times √R it is that of R. */
export function ohmNoise(band: BandConditions): OhmNoise {
  return (temperature) =>
    sourceFloor({
      source: { resistance: 1, inductance: 0, capacitance: 0 },
      ambientTemperature: temperature,
      band,
      stage: { topology: 'non-inverting', gain: 1 },
      referenceFrequency: band.upper,
      bandwidthMargin: 0,
      amplifierTemperatureModel: 'none',
    }).inputNoiseRms;
}

/**
 * The noise of a resistor that carries a direct voltage: thermal √(4kT·R·B) at its own temperature, and
 * excess V·10^(NI/20)·1e-6·√(∫|H|²/f df / ln 10).
 *
 * Self-heating: T = ambient + rise·P/P_rated, linear in the dissipation P = V²/R (common practice, no
 * source); without a known rise and rating, T = ambient.
 *
 * @param noiseOfOhm from `ohmNoise` of the same band
 * Source: Johnson 1928, Nyquist 1928; IEC 60195.
 */
export function resistorNoise(
  conditions: ResistorConditions,
  resistor: Resistor,
  noiseOfOhm: OhmNoise = ohmNoise(conditions.band),
): ResistorFigures {
  const { resistance, noiseIndex } = resistor;
  const dissipation = conditions.dcVoltage ** 2 / resistance;
  const temperature = conditions.ambientTemperature + selfHeating(resistor, dissipation);
  const thermalRms = noiseOfOhm(temperature) * Math.sqrt(resistance);
  const excessRms = noiseIndex === null ? unknownExcess(conditions) : excess(conditions, noiseIndex);
  const totalRms = Math.hypot(thermalRms, excessRms ?? 0);
  return {
    thermalRms,
    excessRms,
    totalRms,
    aboveThermal: 20 * Math.log10(totalRms / thermalRms),
    dissipation,
    temperature,
    cautions: resistorCautions(conditions, resistor, dissipation),
  };
}

function selfHeating({ powerRating, temperatureRise }: Resistor, dissipation: number): number {
  return powerRating === null || temperatureRise === null ? 0 : (temperatureRise * dissipation) / powerRating;
}

/** Without a direct voltage there is no excess noise, whatever the noise index. */
function unknownExcess({ dcVoltage }: ResistorConditions): number | null {
  return dcVoltage === 0 ? 0 : null;
}

function excess({ band, dcVoltage }: ResistorConditions, noiseIndex: number): number {
  return excessNoiseRms(noiseIndex, dcVoltage, 1, Math.exp(flickerNoiseBandwidth(band)));
}
