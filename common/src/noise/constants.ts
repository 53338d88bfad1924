/** Boltzmann constant k in J/K, exact. Source: SI Brochure, 9th edition, 2019. */
export const BOLTZMANN = 1.380649e-23;

/** Planck constant h in J s, exact. Source: SI Brochure, 9th edition, 2019. */
export const PLANCK = 6.62607015e-34;

/** Elementary charge q in C, exact. Source: SI Brochure, 9th edition, 2019. */
export const ELEMENTARY_CHARGE = 1.602176634e-19;

/** Standard noise temperature T₀ in K, at which a noise figure counts the source. Source: IRE standard 1952, IEEE. */
export const STANDARD_NOISE_TEMPERATURE = 290;

/** Temperature in K at which the parameters of amplifiers are given (25 °C; common practice, no source). */
export const PARAMETER_TEMPERATURE = 298.15;

/** Peak-to-peak over rms of Gaussian noise, exceeded 0.1 % of the time (common practice, no source). */
export const PEAK_TO_PEAK_OVER_RMS = 6.6;
