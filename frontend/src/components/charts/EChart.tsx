import { LineChart } from 'echarts/charts';
import { GridComponent, MarkLineComponent, MarkPointComponent, TooltipComponent } from 'echarts/components';
import { init, use as register, type ECharts, type EChartsCoreOption } from 'echarts/core';
import { SVGRenderer } from 'echarts/renderers';
import { useEffect, useImperativeHandle, useRef, type Ref } from 'react';

register([LineChart, GridComponent, MarkLineComponent, MarkPointComponent, TooltipComponent, SVGRenderer]);

export interface ChartHandle {
  /** The drawing as a document of its own, with its size in pixels. */
  svg: () => { text: string; width: number; height: number } | null;
}

interface EChartProps {
  option: EChartsCoreOption;
  label: string;
  height: number;
  ref?: Ref<ChartHandle>;
}

/** A chart that follows the size of its place. */
export function EChart({ option, label, height, ref }: EChartProps) {
  const place = useRef<HTMLDivElement>(null);
  const chart = useRef<ECharts | null>(null);
  useEffect(() => {
    const drawn = init(place.current, null, { renderer: 'svg' });
    chart.current = drawn;
    const observer = new ResizeObserver(() => drawn.resize());
    observer.observe(place.current!);
    return () => {
      observer.disconnect();
      drawn.dispose();
    };
  }, []);
  useEffect(() => {
    chart.current?.setOption(option, { notMerge: true });
  }, [option]);
  useImperativeHandle(ref, () => ({ svg: () => svgOf(chart.current) }), []);
  return <div ref={place} role="img" aria-label={label} style={{ width: '100%', height }} />;
}

function svgOf(chart: ECharts | null) {
  return chart && { text: chart.renderToSVGString(), width: chart.getWidth(), height: chart.getHeight() };
}
