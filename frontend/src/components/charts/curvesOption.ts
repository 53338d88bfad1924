import type { EChartsCoreOption } from 'echarts/core';
import { FONT_FAMILY, type Tokens } from '../../theme';
import { axisName, tickText } from './axisText';
import type { Axis, Curve, CurvesPlot } from './curve';
import { curveTooltip } from './curveTooltip';
import { LABEL_GAP, placeLabels, type LabelPlace } from './labelPlacement';
import { decadesAround } from './logRange';

const [LEFT, RIGHT, TOP, BOTTOM] = [46, 12, 24, 40];
/** Pixels; a wider chart only leaves the labels more room. */
const USUAL_WIDTH = 340;
const LONGEST_NAME = 22;

const DASHES: Record<Curve['stroke'], number[] | 'solid'> = {
  solid: 'solid',
  thick: 'solid',
  dashed: [6, 4],
  dotted: [2, 3],
};

/** A plot as the drawing library takes it, in the colours of the theme. */
export function curvesOption(given: CurvesPlot, tokens: Tokens, height: number): EChartsCoreOption {
  const plot = { ...given, curves: given.curves.map(drawable) };
  const xs = plot.curves.flatMap(({ points }) => points.map(([x]) => x));
  const xRange: [number, number] = [Math.min(...xs), Math.max(...xs)];
  const yRange = decadesAround(plot.curves.flatMap(({ points }) => points.map(([, y]) => y)));
  const size = { width: USUAL_WIDTH - LEFT - RIGHT, height: height - TOP - BOTTOM };
  const places = placeLabels(plot.curves, { x: xRange, y: yRange, markAt: plot.mark?.at, ...size });
  return {
    animation: false,
    textStyle: { fontFamily: FONT_FAMILY, color: tokens.muted, fontSize: 12 },
    grid: { left: LEFT, right: RIGHT, top: TOP, bottom: BOTTOM },
    xAxis: axisOption(plot.x, xRange, tokens),
    yAxis: { ...axisOption(plot.y, yRange, tokens), ...Y_NAME },
    tooltip: curveTooltip(plot, tokens),
    series: plot.curves.map((curve, index) =>
      seriesOption(curve, places[index], index === 0 ? plot.mark : undefined, tokens),
    ),
  };
}

/** A logarithmic axis has no zero, and a label must leave room for the others. */
function drawable(curve: Curve): Curve {
  const { name, points } = curve;
  const shortened = name.length > LONGEST_NAME ? `${name.slice(0, LONGEST_NAME - 1)}…` : name;
  return { ...curve, name: shortened, points: points.filter(([, y]) => y > 0) };
}

const Y_NAME = { nameLocation: 'end', nameGap: 9, nameTextStyle: { align: 'left', padding: [0, 0, 0, -40] } };

function axisOption({ label, kind }: Axis, [min, max]: [number, number], tokens: Tokens) {
  const decades = Math.max(1, Math.round(Math.log10(max / min)));
  return {
    type: 'log',
    name: axisName(label, kind),
    nameLocation: 'middle',
    nameGap: 22,
    nameTextStyle: { color: tokens.muted, fontSize: 12 },
    min,
    max,
    splitNumber: decades,
    axisLine: { show: true, lineStyle: { color: tokens.muted } },
    axisTick: { show: false },
    axisLabel: {
      color: tokens.muted,
      fontSize: 12,
      hideOverlap: true,
      formatter: (value: number) => tickText(value, kind),
    },
    axisPointer: { label: { show: false } },
    splitLine: { lineStyle: { color: tokens.rule } },
  };
}

function seriesOption(curve: Curve, place: LabelPlace | null, mark: CurvesPlot['mark'], tokens: Tokens) {
  const colour = tokens[curve.colour];
  return {
    type: 'line',
    name: curve.name,
    data: curve.points,
    symbol: 'none',
    silent: true,
    lineStyle: { color: colour, width: curve.stroke === 'thick' ? 3 : 1.8, type: DASHES[curve.stroke] },
    itemStyle: { color: colour },
    markPoint: labelOption(curve, place, tokens),
    markLine: mark && markOption(mark.at, tokens),
  };
}

function labelOption(curve: Curve, place: LabelPlace | null, tokens: Tokens) {
  if (place === null) return undefined;
  const { coord, align, verticalAlign } = place;
  const dx = { left: LABEL_GAP, center: 0, right: -LABEL_GAP }[align];
  const dy = verticalAlign === 'bottom' ? -LABEL_GAP : LABEL_GAP;
  return {
    symbol: 'circle',
    symbolSize: 0.01,
    silent: true,
    label: {
      show: true,
      align,
      verticalAlign,
      position: [dx, dy],
      color: curve.colour === 'slate' ? tokens.muted : tokens[curve.colour],
      formatter: curve.name,
    },
    data: [{ coord }],
  };
}

function markOption(at: number, tokens: Tokens) {
  return {
    symbol: 'none',
    silent: true,
    label: { show: false },
    lineStyle: { color: tokens.ink, type: [2, 3], width: 1.2 },
    data: [{ xAxis: at }],
  };
}
