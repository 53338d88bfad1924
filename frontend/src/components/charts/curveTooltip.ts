import { format } from 'echarts/core';
import type { Tokens } from '../../theme';
import { valueText } from './axisText';
import type { CurvesPlot } from './curve';

interface PointUnderPointer {
  seriesName: string;
  value: [number, number];
  color: string;
}

/** The cross-hair and the values at it; the curves' names come from parts lists and are escaped. */
export function curveTooltip({ x, y }: CurvesPlot, tokens: Tokens) {
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
    axisPointer: { type: 'cross', lineStyle: { color: tokens.muted }, crossStyle: { color: tokens.muted } },
    formatter: (points: PointUnderPointer[]) => {
      if (points.length === 0) return '';
      const lines = points.map(
        ({ seriesName, value, color }) =>
          `<span style="color:${color}">━</span> ${format.encodeHTML(seriesName)} <b>${valueText(value[1], y.kind)}</b>`,
      );
      return [`at ${valueText(points[0].value[0], x.kind)}`, ...lines].join('<br>');
    },
  };
}
