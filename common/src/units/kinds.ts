/** The kinds of physical quantity that fields hold; each has one SI unit. */
export type QuantityKind =
  | 'resistance'
  | 'capacitance'
  | 'inductance'
  | 'frequency'
  | 'temperature'
  | 'temperatureDifference'
  | 'temperatureCoefficient'
  | 'voltage'
  | 'current'
  | 'voltageNoiseDensity'
  | 'currentNoiseDensity'
  | 'power'
  | 'gain'
  | 'fraction'
  | 'decibel'
  | 'count';
