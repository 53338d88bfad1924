/**
 * Square of the excess (1/f) noise density of a resistor that carries a direct voltage:
 * (V·10^(NI/20)·1e-6)²/(ln 10·f).
 *
 * @param noiseIndex dB; 0 dB = 1 µV rms per volt in one decade of frequency
 * @param directVoltage V across the resistor, either sign
 * @param frequency Hz, > 0
 * @returns V²/Hz
 * Source: IEC 60195.
 */
export function excessPowerDensity(noiseIndex: number, directVoltage: number, frequency: number): number {
  return excessPerDecade(noiseIndex, directVoltage) ** 2 / (Math.LN10 * frequency);
}

/**
 * Excess noise of a resistor over a band, V·10^(NI/20)·1e-6·√log₁₀(f₂/f₁).
 *
 * @param noiseIndex dB
 * @param directVoltage V across the resistor, either sign
 * @param lower Hz, > 0
 * @param upper Hz, > lower
 * @returns V rms
 * Source: IEC 60195.
 */
export function excessNoiseRms(
  noiseIndex: number,
  directVoltage: number,
  lower: number,
  upper: number,
): number {
  return excessPerDecade(noiseIndex, directVoltage) * Math.sqrt(Math.log10(upper / lower));
}

function excessPerDecade(noiseIndex: number, directVoltage: number): number {
  return Math.abs(directVoltage) * 10 ** (noiseIndex / 20) * 1e-6;
}
