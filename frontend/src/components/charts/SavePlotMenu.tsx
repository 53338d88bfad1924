import { Button, Dropdown } from 'antd';
import type { RefObject } from 'react';
import { useTokens } from '../useTokens';
import type { ChartHandle } from './EChart';
import { PLOT_FORMATS, savePlot, type PlotFormat, type SavedPlot } from './savePlot';

interface SavePlotMenuProps {
  plot: SavedPlot;
  chart: RefObject<ChartHandle | null>;
}

const QUIET = { color: 'var(--muted)', fontSize: 13.5 };

/** Saves a chart as a picture or its figures. */
export function SavePlotMenu({ plot, chart }: SavePlotMenuProps) {
  const { paper } = useTokens();
  const onClick = ({ key }: { key: string }) =>
    void (chart.current && savePlot(plot, chart.current, key as PlotFormat, paper));
  const items = PLOT_FORMATS.map((format) => ({ key: format, label: `as ${format}` }));
  return (
    <Dropdown trigger={['click']} autoFocus menu={{ items, onClick }}>
      <Button type="text" size="small" style={QUIET} aria-label={`Save the chart “${plot.title}”`}>
        Save ▾
      </Button>
    </Dropdown>
  );
}
