import type { EChartsCoreOption } from 'echarts/core';
import { format } from 'echarts/core';
import { formatDay } from '../../../components/formatDay';
import { FONT_FAMILY, type Tokens } from '../../../theme';
import { labelOffsets } from './labelOffsets';
import type { PriceLine } from './priceSteps';

const COLOURS = ['damson', 'verdigris', 'ochre', 'rust', 'slate'] as const satisfies (keyof Tokens)[];
const DASHES: readonly ('solid' | number[])[] = ['solid', [6, 4], [2, 3], [8, 3, 2, 3], [12, 3]];

const TOP = 26;
const BOTTOM = 24;
/** A line that has just begun is shown in a span of time, too. */
const LEAST_SPAN = 30 * 86_400_000;

/** Step lines over time with their names at their ends, in the colours of the theme. */
export function priceHistoryOption(
  lines: readonly PriceLine[],
  currency: string,
  tokens: Tokens,
  height: number,
): EChartsCoreOption {
  const offsets = labelOffsets(
    lines.map(({ points }) => lastPrice(points)?.[1] ?? 0),
    height - TOP - BOTTOM,
  );
  const text = { color: tokens.muted, fontSize: 12 };
  const axis = { axisLine: { show: true, lineStyle: { color: tokens.muted } }, axisTick: { show: false } };
  return {
    animation: false,
    textStyle: { fontFamily: FONT_FAMILY, ...text },
    grid: { left: 46, right: 150, top: TOP, bottom: BOTTOM },
    xAxis: {
      type: 'time',
      min: beginning,
      ...axis,
      axisLabel: { ...text, hideOverlap: true },
      splitLine: { show: false },
    },
    yAxis: {
      type: 'value',
      scale: true,
      name: `${currency} a piece`,
      nameTextStyle: { ...text, align: 'left', padding: [0, 0, 0, -40] },
      ...axis,
      axisLabel: text,
      splitLine: { lineStyle: { color: tokens.rule } },
    },
    tooltip: tooltipOf(currency, tokens),
    series: lines.map((line, index) => seriesOf(line, index, offsets[index], tokens)),
  };
}

/** The time axis begins no later than this. */
function beginning({ min, max }: { min: number; max: number }): number {
  return Math.min(min, max - LEAST_SPAN);
}

/** Each line has a stroke of its own: after the colours are used up, they come again with other dashes. */
function strokeOf(index: number) {
  const round = Math.floor(index / COLOURS.length);
  return [COLOURS[index % COLOURS.length], DASHES[(index + round) % DASHES.length]] as const;
}

function lastPrice(points: PriceLine['points']): readonly [number, number] | undefined {
  return points.findLast((point): point is readonly [number, number] => point[1] !== null);
}

/** Each price is marked where it begins, which shows one that has just begun; not where the line ends. */
function marked(points: PriceLine['points']) {
  return points.map((value, index) => ({
    value,
    symbol: value[1] === null || points[index + 1]?.[1] === null ? 'none' : 'circle',
  }));
}

function seriesOf({ name, points }: PriceLine, index: number, offset: number, tokens: Tokens) {
  const [colour, type] = strokeOf(index);
  const ink = colour === 'slate' ? tokens.muted : tokens[colour];
  const last = lastPrice(points);
  return {
    type: 'line',
    name,
    step: 'end',
    symbolSize: 5,
    showAllSymbol: true,
    data: marked(points),
    lineStyle: { color: tokens[colour], width: 1.8, type },
    itemStyle: { color: tokens[colour] },
    markPoint: last && {
      symbol: 'circle',
      symbolSize: 0.01,
      silent: true,
      label: {
        show: true,
        position: 'right',
        offset: [0, offset],
        color: ink,
        fontSize: 12,
        width: 136,
        overflow: 'truncate',
        formatter: name,
      },
      data: [{ coord: last }],
    },
  };
}

interface PointUnderPointer {
  seriesName: string;
  value: [number, number | null];
  color: string;
}

function tooltipOf(currency: string, tokens: Tokens) {
  return {
    trigger: 'axis',
    confine: true,
    transitionDuration: 0,
    backgroundColor: tokens.sheet,
    borderColor: tokens.rule,
    borderWidth: 1,
    padding: [4, 8],
    extraCssText: 'box-shadow: none; border-radius: 4px;',
    textStyle: { color: tokens.ink, fontSize: 13 },
    formatter: (points: PointUnderPointer[]) => {
      const lines = points
        .filter(({ value }) => value[1] !== null)
        .map(
          ({ seriesName, value, color }) =>
            `<span style="color:${color}">━</span> ${format.encodeHTML(seriesName)} <b>${value[1]} ${currency}</b>`,
        );
      if (lines.length === 0) return '';
      return [`from ${formatDay(new Date(points[0].value[0]).toISOString())}`, ...lines].join('<br>');
    },
  };
}
