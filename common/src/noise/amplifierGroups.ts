import type { OperatingConditions } from '../conditions/index.js';
import { closedFormNode, isClassical, poleRange, quadratureNodes, type PoleRange } from './bandNodes.js';
import type { Evaluate, StageModel } from './stage/model.js';

/** What places an amplifier's poles: gain–bandwidth products in Hz (Infinity = ideal) and input capacitances in F. */
export interface DynamicColumns {
  gainBandwidth: ArrayLike<number>;
  inputCapacitance: ArrayLike<number>;
}

/** Amplifiers that share the nodes of a quadrature, and the sum over those nodes. */
export interface AmplifierGroup {
  rows: number[];
  evaluate: Evaluate;
}

/** Poles nearer to the axis of ln f than this angle make a resonance for which nodes must be found. */
const SHARP = 0.7;
/** A group's resonances may spread over this many times their width. */
const SPREAD = 4;

/**
 * Parts the amplifiers into groups that one set of nodes serves: those in whose stages nothing depends on
 * frequency (closed form, one node), those without a resonance (one set), and those that resonate, group
 * by group of neighbouring resonances, so that even a Q of thousands is met by nodes of its own.
 */
export function groupAmplifiers(
  conditions: OperatingConditions,
  model: StageModel,
  columns: DynamicColumns,
  rows: ArrayLike<number>,
): AmplifierGroup[] {
  const staysClosed = model.resistive && isClassical(conditions);
  const closedForm: number[] = [];
  const smooth = new QuadratureRows(model, columns);
  const resonant: ResonantRow[] = [];
  for (let i = 0; i < rows.length; i++) {
    const row = rows[i];
    const inputCapacitance = columns.inputCapacitance[row];
    if (staysClosed && inputCapacitance === 0 && columns.gainBandwidth[row] === Infinity)
      closedForm.push(row);
    else if (!model.mayResonate(inputCapacitance)) smooth.add(row);
    else placeByPoles(model, columns, row, smooth, resonant);
  }
  smooth.widenByExtremes();
  return [
    ...(closedForm.length > 0
      ? [{ rows: closedForm, evaluate: model.compile(closedFormNode(conditions)) }]
      : []),
    ...[smooth, ...splitByResonance(model, columns, resonant)]
      .filter(({ rows: members }) => members.length > 0)
      .map((members) => members.toGroup(conditions)),
  ];
}

interface ResonantRow {
  row: number;
  sharpest: PoleRange;
  poles: PoleRange[];
}

function placeByPoles(
  model: StageModel,
  columns: DynamicColumns,
  row: number,
  smooth: QuadratureRows,
  resonant: ResonantRow[],
): void {
  const poles = model.poles(columns.gainBandwidth[row], columns.inputCapacitance[row]).map(poleRange);
  const sharpest = poles.reduce((least, pole) => (pole.angle < least.angle ? pole : least));
  if (sharpest.angle < SHARP) resonant.push({ row, sharpest, poles });
  else smooth.add(row, poles);
}

function splitByResonance(
  model: StageModel,
  columns: DynamicColumns,
  resonant: ResonantRow[],
): QuadratureRows[] {
  resonant.sort((a, b) => a.sharpest.from - b.sharpest.from);
  const groups: QuadratureRows[] = [];
  let start = 0;
  let angle = Infinity;
  for (const { row, sharpest, poles } of resonant) {
    angle = Math.min(angle, sharpest.angle);
    if (groups.length === 0 || Math.log(sharpest.from / start) > SPREAD * angle) {
      groups.push(new QuadratureRows(model, columns));
      start = sharpest.from;
      angle = sharpest.angle;
    }
    groups[groups.length - 1].add(row, poles);
  }
  return groups;
}

/** Rows that share a quadrature, with the ranges in which their poles lie. */
class QuadratureRows {
  readonly rows: number[] = [];
  private readonly ranges = new Map<string, PoleRange>();
  private readonly slowest = [Infinity, Infinity];
  private readonly fastest = [0, 0];
  private growth: 0 | 2 = 0;

  constructor(
    private readonly model: StageModel,
    private readonly columns: DynamicColumns,
  ) {}

  /** Takes a row with its poles; without them, its extremes are noted. */
  add(row: number, poles?: PoleRange[]): void {
    this.rows.push(row);
    const inputCapacitance = this.columns.inputCapacitance[row];
    if (this.model.growth(inputCapacitance) === 2) this.growth = 2;
    if (poles) this.widen(poles);
    else this.noteExtremes(this.columns.gainBandwidth[row], inputCapacitance);
  }

  /** Poles on the real axis move one way with each parameter: those of the extremes enclose all. */
  widenByExtremes(): void {
    if (this.slowest[0] === Infinity && this.slowest[1] === Infinity) return;
    for (const gainBandwidth of [this.slowest[0], this.fastest[0]]) {
      for (const inputCapacitance of [this.slowest[1], this.fastest[1]])
        this.widen(this.model.poles(gainBandwidth, inputCapacitance).map(poleRange));
    }
  }

  toGroup(conditions: OperatingConditions): AmplifierGroup {
    const nodes = quadratureNodes(conditions, [...this.ranges.values()], this.growth);
    return { rows: this.rows, evaluate: this.model.compile(nodes) };
  }

  private noteExtremes(gainBandwidth: number, inputCapacitance: number): void {
    this.slowest[0] = Math.min(this.slowest[0], gainBandwidth);
    this.slowest[1] = Math.min(this.slowest[1], inputCapacitance);
    this.fastest[0] = Math.max(this.fastest[0], gainBandwidth);
    this.fastest[1] = Math.max(this.fastest[1], inputCapacitance);
  }

  private widen(poles: PoleRange[]): void {
    poles.sort((a, b) => a.angle - b.angle);
    poles.forEach((pole, place) => {
      const name = pole.angle < SHARP ? `sharp ${place}` : 'smooth';
      const range = this.ranges.get(name);
      if (!range) this.ranges.set(name, { ...pole });
      else {
        range.from = Math.min(range.from, pole.from);
        range.to = Math.max(range.to, pole.to);
        range.angle = Math.min(range.angle, pole.angle);
      }
    });
  }
}
