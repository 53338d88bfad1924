import type { EChartsCoreOption } from 'echarts/core';
import { format } from 'echarts/core';
import { formatDay } from '../../../components/formatDay';
import { FONT_FAMILY, type Tokens } from '../../../theme';
import type { PriceLine } from './priceSteps';

const STROKES: readonly [keyof Tokens, 'solid' | number[]][] = [
  ['damson', 'solid'],
  ['verdigris', [6, 4]],
  ['ochre', [2, 3]],
  ['rust', [8, 3, 2, 3]],
  ['slate', 'solid'],
];

/** Step lines over time with their names at their ends, in the colours of the theme. */
export function priceHistoryOption(
  lines: readonly PriceLine[],
  currency: string,
  tokens: Tokens,
): EChartsCoreOption {
  const text = { color: tokens.muted, fontSize: 12 };
  const axis = { axisLine: { show: true, lineStyle: { color: tokens.muted } }, axisTick: { show: false } };
  return {
    animation: false,
    textStyle: { fontFamily: FONT_FAMILY, ...text },
    grid: { left: 46, right: 150, top: 26, bottom: 24 },
    xAxis: { type: 'time', ...axis, axisLabel: { ...text, hideOverlap: true }, splitLine: { show: false } },
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
    series: lines.map((line, index) => seriesOf(line, STROKES[index % STROKES.length], tokens)),
  };
}

function seriesOf({ name, points }: PriceLine, [colour, type]: (typeof STROKES)[number], tokens: Tokens) {
  const ink = colour === 'slate' ? tokens.muted : tokens[colour];
  const last = points.findLast(([, price]) => price !== null);
  return {
    type: 'line',
    name,
    step: 'end',
    symbol: 'none',
    data: points,
    lineStyle: { color: tokens[colour], width: 1.8, type },
    itemStyle: { color: tokens[colour] },
    markPoint: last && {
      symbol: 'circle',
      symbolSize: 0.01,
      silent: true,
      label: {
        show: true,
        position: 'right',
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
