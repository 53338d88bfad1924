import type { Nodes } from './nodes.js';

/** What stands before a + input: Z = R + jωL and C of the source, and the conductance of a load in S. */
export interface InputCircuit {
  resistance: number;
  inductance: number;
  capacitance: number;
  loadConductance: number;
}

/** D = 1 + Z·(jω(C + C_in) + 1/R_L), by which the source's voltage is divided, in powers of s. */
export function dividerPowers(
  { resistance, inductance, capacitance, loadConductance }: InputCircuit,
  inputCapacitance: number,
): [number, number, number] {
  const whole = capacitance + inputCapacitance;
  return [
    1 + resistance * loadConductance,
    resistance * whole + inductance * loadConductance,
    inductance * whole,
  ];
}

/** D at each node without the input capacitance, what a farad of that adds to it, and |Z|². */
export interface DividerNodes {
  real: Float64Array;
  imaginary: Float64Array;
  realPerFarad: Float64Array;
  imaginaryPerFarad: Float64Array;
  impedance2: Float64Array;
}

/** Prepares the divider once for all amplifiers. */
export function dividerNodes({ count, angular }: Nodes, circuit: InputCircuit): DividerNodes {
  const { resistance, inductance, capacitance, loadConductance } = circuit;
  const column = () => new Float64Array(count);
  const divider: DividerNodes = {
    real: column(),
    imaginary: column(),
    realPerFarad: column(),
    imaginaryPerFarad: column(),
    impedance2: column(),
  };
  for (let k = 0; k < count; k++) {
    const w = angular[k];
    divider.realPerFarad[k] = -w * w * inductance;
    divider.imaginaryPerFarad[k] = w * resistance;
    divider.real[k] = 1 + resistance * loadConductance + divider.realPerFarad[k] * capacitance;
    divider.imaginary[k] = w * inductance * loadConductance + divider.imaginaryPerFarad[k] * capacitance;
    divider.impedance2[k] = resistance * resistance + w * w * inductance * inductance;
  }
  return divider;
}

/** By how many powers of f the density of the current noise in the source grows towards infinity. */
export function dividerGrowth(circuit: InputCircuit, inputCapacitance: number): 0 | 2 {
  const isOpen = circuit.loadConductance === 0 && circuit.capacitance + inputCapacitance === 0;
  return circuit.inductance > 0 && isOpen ? 2 : 0;
}
