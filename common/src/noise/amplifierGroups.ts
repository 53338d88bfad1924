import type { OperatingConditions } from '../conditions/index.js';
import { closedFormNode, isClassical, poleRange, quadratureNodes, type PoleRange } from './bandNodes.js';
import type { Evaluate, StageModel } from './stage/model.js';

/** What places an amplifier's poles: gain–bandwidth products in Hz (Infinity = ideal) and input capacitances in F. */
export interface DynamicColumns {
  gainBandwidth: ArrayLike<number>;
  inputCapacitance: ArrayLike<number>;
}

/** Amplifiers, by their places in the columns, that share the nodes of a quadrature, and the sum over those nodes. */
export interface AmplifierGroup {
  rows: number[];
  evaluate: Evaluate;
}

/** Resonances of a higher quality get nodes of their own; at this one the poles' angle is about 0.7. */
const SHARP_QUALITY = 0.776;
const SHARP_ANGLE = 0.7;
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
): AmplifierGroup[] {
  const staysClosed = model.resistive && isClassical(conditions);
  const closedForm: number[] = [];
  const smooth = new QuadratureRows(model, columns);
  const resonant: ResonantRow[] = [];
  for (let row = 0; row < columns.gainBandwidth.length; row++) {
    const inputCapacitance = columns.inputCapacitance[row];
    if (staysClosed && inputCapacitance === 0 && columns.gainBandwidth[row] === Infinity)
      closedForm.push(row);
    else placeByQuality(model, columns, row, smooth, resonant);
  }
  return [
    ...(closedForm.length > 0
      ? [{ rows: closedForm, evaluate: model.compile(closedFormNode(conditions)) }]
      : []),
    ...[smooth, ...groupResonant(model, columns, resonant)]
      .filter(({ rows: members }) => members.length > 0)
      .map((members) => members.toGroup(conditions)),
  ];
}

/** A row and its poles, the sharpest first. */
interface ResonantRow {
  row: number;
  poles: PoleRange[];
}

function placeByQuality(
  model: StageModel,
  columns: DynamicColumns,
  row: number,
  smooth: QuadratureRows,
  resonant: ResonantRow[],
): void {
  const gainBandwidth = columns.gainBandwidth[row];
  const inputCapacitance = columns.inputCapacitance[row];
  const quality = model.quality(gainBandwidth, inputCapacitance);
  if (quality < SHARP_QUALITY) {
    smooth.addSmooth(row, quality);
    return;
  }
  const poles = model.poles(gainBandwidth, inputCapacitance).map(poleRange);
  poles.sort((a, b) => a.angle - b.angle);
  resonant.push({ row, poles });
}

function groupResonant(
  model: StageModel,
  columns: DynamicColumns,
  resonant: ResonantRow[],
): QuadratureRows[] {
  return splitByResonance(resonant, 0).map((members) => {
    const group = new QuadratureRows(model, columns);
    for (const { row, poles } of members) group.addResonant(row, poles);
    return group;
  });
}

/**
 * Groups of rows whose poles at `place` are neighbours, and within them those at each later place: a sharp
 * pole's range is never much wider than the pole is sharp, or a panel as short would be needed all over it.
 */
function splitByResonance(rows: ResonantRow[], place: number): ResonantRow[][] {
  const frequency = ({ poles }: ResonantRow) => poles[place]?.from ?? 0;
  const angleOf = ({ poles }: ResonantRow) => Math.min(SHARP_ANGLE, poles[place]?.angle ?? SHARP_ANGLE);
  if (rows.every((row) => angleOf(row) === SHARP_ANGLE)) return rows.length > 0 ? [rows] : [];
  const groups: ResonantRow[][] = [];
  let start = 0;
  let angle = SHARP_ANGLE;
  for (const member of rows.toSorted((a, b) => frequency(a) - frequency(b))) {
    const here = frequency(member);
    angle = Math.min(angle, angleOf(member));
    if (groups.length === 0 || (angle < SHARP_ANGLE && Math.log(here / start) > SPREAD * angle)) {
      groups.push([]);
      start = here;
      angle = angleOf(member);
    }
    groups[groups.length - 1].push(member);
  }
  return groups.flatMap((group) => splitByResonance(group, place + 1));
}

/** Rows that share a quadrature, with the ranges in which their poles lie. */
class QuadratureRows {
  readonly rows: number[] = [];
  private readonly ranges: PoleRange[] = [];
  private readonly gainBandwidths = { least: Infinity, most: 0 };
  private readonly inputCapacitances = { least: Infinity, most: 0 };
  private quality = 0;

  constructor(
    private readonly model: StageModel,
    private readonly columns: DynamicColumns,
  ) {}

  addSmooth(row: number, quality: number): void {
    this.add(row);
    if (quality > this.quality) this.quality = quality;
  }

  /** Takes a row with its poles, the sharpest first: the n-th poles of all rows make one range. */
  addResonant(row: number, poles: PoleRange[]): void {
    this.add(row);
    poles.forEach((pole, place) => {
      const range = (this.ranges[place] ??= { ...pole });
      range.from = Math.min(range.from, pole.from);
      range.to = Math.max(range.to, pole.to);
      range.angle = Math.min(range.angle, pole.angle);
    });
  }

  toGroup(conditions: OperatingConditions): AmplifierGroup {
    const { most } = this.inputCapacitances;
    const nodes = quadratureNodes(
      conditions,
      this.ranges.length > 0 ? this.ranges : this.smoothRanges(),
      Math.max(this.model.growth(this.inputCapacitances.least), this.model.growth(most)) as 0 | 2,
    );
    return { rows: this.rows, evaluate: this.model.compile(nodes) };
  }

  private add(row: number): void {
    this.rows.push(row);
    widen(this.gainBandwidths, this.columns.gainBandwidth[row]);
    widen(this.inputCapacitances, this.columns.inputCapacitance[row]);
  }

  /** Smooth poles move one way with each parameter: those of the extremes enclose all. */
  private smoothRanges(): PoleRange[] {
    const corners = Object.values(this.gainBandwidths).flatMap((gainBandwidth) =>
      Object.values(this.inputCapacitances).flatMap((inputCapacitance) =>
        this.model.poles(gainBandwidth, inputCapacitance).map(poleRange),
      ),
    );
    if (corners.length === 0) return [];
    return [
      {
        from: Math.min(...corners.map(({ from }) => from)),
        to: Math.max(...corners.map(({ to }) => to)),
        angle: this.quality > 0.5 ? SHARP_ANGLE : Math.PI / 2,
      },
    ];
  }
}

function widen(range: { least: number; most: number }, value: number): void {
  if (value < range.least) range.least = value;
  if (value > range.most) range.most = value;
}
