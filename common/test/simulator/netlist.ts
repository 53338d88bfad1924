import type { OperatingConditions } from '../../src/conditions/index.js';
import { BOLTZMANN, ELEMENTARY_CHARGE, type Contributor } from '../../src/noise/index.js';
import type { KnownAmplifier } from '../support/nodalAnalysis.js';

/** K: 27 °C, at which the simulator runs every resistor whatever the instance says. */
const CIRCUIT_TEMPERATURE = 300.15;
const UNIT_DENSITY = Math.sqrt(4 * BOLTZMANN * CIRCUIT_TEMPERATURE);
/** Open-loop gain at 0 Hz, as good as infinite. */
const DC_GAIN = 1e12;

/** A vector of the simulator's noise analysis: what it counts as, and by how much it must be scaled. */
export interface SimulatedGenerator {
  vector: string;
  contributor: Contributor;
  scale: number;
}

/** A circuit under construction. */
export class Netlist {
  readonly generators: SimulatedGenerator[] = [];
  private readonly lines: string[] = ['vone one 0 1'];
  private count = 0;

  text(title: string): string {
    return [`* ${title}`, ...this.lines, '.end', ''].join('\n');
  }

  add(...line: (string | number)[]): void {
    this.lines.push(line.join(' '));
  }

  /** A resistor whose thermal noise counts at its own temperature; 0 Ω is a plain connection. */
  resistor(
    from: string,
    to: string,
    resistance: number,
    temperature: number,
    contributor: Contributor,
  ): void {
    const name = `r${this.next()}`;
    if (resistance === 0) return this.add(`v${name}`, from, to, 0);
    this.add(name, from, to, resistance);
    this.generators.push({
      vector: `onoise_${name}_thermal`,
      contributor,
      scale: temperature / CIRCUIT_TEMPERATURE,
    });
  }

  capacitor(from: string, to: string, capacitance: number): void {
    if (capacitance > 0) this.add(`c${this.next()}`, from, to, capacitance);
  }

  inductor(from: string, to: string, inductance: number): void {
    const name = this.next();
    if (inductance > 0) this.add(`l${name}`, from, to, inductance);
    else this.add(`vl${name}`, from, to, 0);
  }

  /**
   * Voltage noise between two nodes: 1 Ω at 1 A makes thermal and 1/f noise, a controlled source scales it.
   * V/√Hz and Hz.
   */
  voltageNoise(plus: string, minus: string, density: number, corner: number, contributor: Contributor): void {
    const { id, control } = this.generator(corner, contributor);
    this.add(`e${id}`, plus, minus, control, density / UNIT_DENSITY);
  }

  /** Current noise from ground into a node, A/√Hz. */
  currentNoise(into: string, density: number, corner: number, contributor: Contributor): void {
    const { id, control } = this.generator(corner, contributor);
    this.add(`g${id}`, 0, into, control, density / UNIT_DENSITY);
  }

  private next(): number {
    return ++this.count;
  }

  private generator(corner: number, contributor: Contributor): { id: number; control: string } {
    const id = this.next();
    const flicker = UNIT_DENSITY ** 2 * corner;
    this.add(`.model m${id} r(kf=${flicker} af=2)`);
    this.add(`i${id}`, 0, `n${id}`, 1);
    this.add(`rn${id}`, `n${id}`, 0, 1, `m${id}`);
    for (const part of ['thermal', '1overf'])
      this.generators.push({ vector: `onoise_rn${id}_${part}`, contributor, scale: 1 });
    return { id, control: `n${id} one` };
  }
}

export interface OpAmpNodes {
  plus: string;
  minus: string;
  out: string;
  /** what the current noise of the + input counts as */
  plusCounts?: Contributor;
}

/** An op-amp: e_n behind the + input, i_n into each input, and A(f) = GBW/(jf). */
export function addOpAmp(netlist: Netlist, amplifier: KnownAmplifier, nodes: OpAmpNodes): void {
  const { voltageNoise, voltageNoiseCorner, currentNoise, currentNoiseCorner, gainBandwidth } = amplifier;
  const { plus, minus, out, plusCounts = 'amplifierCurrentSource' } = nodes;
  const inner = `inner_${out}`;
  netlist.voltageNoise(plus, inner, voltageNoise, voltageNoiseCorner, 'amplifierVoltage');
  netlist.currentNoise(plus, currentNoise, currentNoiseCorner, plusCounts);
  netlist.currentNoise(minus, currentNoise, currentNoiseCorner, 'amplifierCurrentFeedback');
  if (gainBandwidth === null) return netlist.add(`eo_${out}`, out, 0, inner, minus, DC_GAIN);
  netlist.add(`gx_${out}`, 0, `x_${out}`, inner, minus, 1);
  netlist.add(`cx_${out}`, `x_${out}`, 0, 1 / (2 * Math.PI * gainBandwidth));
  netlist.add(`rx_${out}`, `x_${out}`, 0, DC_GAIN, 'noisy=0');
  netlist.add(`eo_${out}`, out, 0, `x_${out}`, 0, 1);
}

/** The source's EMF in series with R and L; `share` of its impedance, as in one leg of two. */
export function addSource(
  netlist: Netlist,
  { source, ambientTemperature }: OperatingConditions,
  to: string,
  emf: string,
  share = 1,
): void {
  const middle = `middle_${to}`;
  const temperature = source.temperature ?? ambientTemperature;
  netlist.resistor(emf, middle, source.resistance * share, temperature, 'source');
  netlist.inductor(middle, to, source.inductance * share);
  netlist.capacitor(to, '0', source.capacitance / share);
}

/** Shot noise of a direct current into a node. */
export function addShotNoise(netlist: Netlist, into: string, directCurrent: number): void {
  const density = Math.sqrt(2 * ELEMENTARY_CHARGE * directCurrent);
  if (directCurrent > 0) netlist.currentNoise(into, density, 0, 'source');
}
