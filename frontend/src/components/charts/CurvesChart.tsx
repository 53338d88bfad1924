import { useMemo, type Ref } from 'react';
import { useTokens } from '../useTokens';
import type { CurvesPlot } from './curve';
import { curvesOption } from './curvesOption';
import { EChart, type ChartHandle } from './EChart';

interface CurvesChartProps {
  plot: CurvesPlot;
  height: number;
  ref?: Ref<ChartHandle>;
}

/** Curves over two logarithmic axes, with labels at the curves and a cross-hair. */
export function CurvesChart({ plot, height, ref }: CurvesChartProps) {
  const tokens = useTokens();
  const option = useMemo(() => curvesOption(plot, tokens, height), [plot, tokens, height]);
  const names = plot.curves.map(({ name }) => name).join(', ');
  return <EChart ref={ref} option={option} label={`${plot.title}: ${names}`} height={height} />;
}
