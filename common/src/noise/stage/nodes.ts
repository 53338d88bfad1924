/** Frequencies at which a stage is evaluated, with everything there that no amplifier changes. */
export interface Nodes {
  count: number;
  /** rad/s */
  angular: Float64Array;
  /** Hz; 0 at a node that stands for a band in which nothing depends on frequency */
  frequency: Float64Array;
  /** Hz: quadrature weight times the filter's power response */
  white: Float64Array;
  /** the same over the frequency, a pure number */
  flicker: Float64Array;
  /** density of the source's noise: V²/Hz, in a transimpedance stage A²/Hz */
  sourcePower: Float64Array;
  /** 4kT·Q at the ambient temperature in W/Hz */
  ambientPower: Float64Array;
}

/** Room for the nodes; all arrays are zero. */
export function emptyNodes(count: number): Nodes {
  const column = () => new Float64Array(count);
  return {
    count,
    angular: column(),
    frequency: column(),
    white: column(),
    flicker: column(),
    sourcePower: column(),
    ambientPower: column(),
  };
}
