/** How a resistor is made; it decides how much excess noise it has. */
export const TECHNOLOGIES = [
  'metal-foil',
  'thin-film',
  'metal-film',
  'wirewound',
  'thick-film',
  'carbon-film',
  'carbon-composition',
] as const;
export type Technology = (typeof TECHNOLOGIES)[number];

export const TECHNOLOGY_LABELS: Record<Technology, string> = {
  'metal-foil': 'metal foil',
  'thin-film': 'thin film',
  'metal-film': 'metal film',
  wirewound: 'wirewound',
  'thick-film': 'thick film',
  'carbon-film': 'carbon film',
  'carbon-composition': 'carbon composition',
};

/** A resistor's parameters in SI units, as API, database and noise model use them; `null` = unknown. */
export interface Resistor {
  /** Ω */
  resistance: number;
  /** 0.01 = 1 % */
  tolerance: number | null;
  /** 1/K */
  temperatureCoefficient: number | null;
  /** W */
  powerRating: number | null;
  technology: Technology | null;
  /** dB; 0 dB = 1 µV rms per volt in one decade */
  noiseIndex: number | null;
  /** K above ambient at the rated power */
  temperatureRise: number | null;
}
