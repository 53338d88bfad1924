import type { QuantityKind } from '@roothertz/common/units';
import type { Tokens } from '../../theme';

/** x and y in SI units. */
export type CurvePoint = [number, number];

/** One curve of a chart; told apart by its dash and its label as well as by its colour. */
export interface Curve {
  name: string;
  points: readonly CurvePoint[];
  colour: keyof Tokens;
  stroke: 'solid' | 'dashed' | 'dotted' | 'thick';
}

export interface Axis {
  /** Such as "source resistance". */
  label: string;
  kind: QuantityKind;
}

/** Curves over two logarithmic axes. */
export interface CurvesPlot {
  /** What the chart shows, for screen readers and file names. */
  title: string;
  x: Axis;
  y: Axis;
  curves: readonly Curve[];
  /** The dotted line at the present value. */
  mark?: { at: number; label: string };
}
