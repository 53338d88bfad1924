import type { RankingRequest } from '@roothertz/common/conditions';
import { Tabs } from 'antd';
import { useMemo, useRef, useState } from 'react';
import type { CurvesPlot } from '../../components/charts/curve';
import { CurvesChart } from '../../components/charts/CurvesChart';
import type { ChartHandle } from '../../components/charts/EChart';
import { SavePlotMenu } from '../../components/charts/SavePlotMenu';
import { frequencyPlot } from './frequencyPlot';
import styles from './Picture.module.css';
import { resistancePlot } from './resistancePlot';
import type { SelectedPart } from './useSelectedPart';

const VIEWS = [
  { key: 'resistance', label: 'Resistance' },
  { key: 'frequency', label: 'Frequency' },
] as const;
type View = (typeof VIEWS)[number]['key'];

const LARGE = 248;
const SMALL = 206;

/** The selected part over the floor: the chosen view large, the other one below it. */
export function Picture({ selected, request }: { selected: SelectedPart; request: RankingRequest }) {
  const [view, setView] = useState<View>('resistance');
  const plots = useMemo(() => plotsOf(selected, request), [selected, request]);
  const other = view === 'resistance' ? plots.frequency : plots.resistance;
  const items = VIEWS.map((tab) => ({
    ...tab,
    children: view === tab.key && <Plot plot={plots[tab.key]} height={LARGE} />,
  }));
  return (
    <section aria-label="Picture" className={styles.picture} id="picture">
      <Tabs
        size="small"
        activeKey={view}
        onChange={(key) => setView(key as View)}
        items={items}
        tabBarStyle={{ marginBottom: 4 }}
      />
      <Plot plot={other} height={SMALL} />
    </section>
  );
}

function plotsOf({ part, compared }: SelectedPart, { conditions }: RankingRequest): Record<View, CurvesPlot> {
  return {
    resistance: resistancePlot(conditions, part, compared),
    frequency: frequencyPlot(conditions, part, compared),
  };
}

function Plot({ plot, height }: { plot: CurvesPlot; height: number }) {
  const chart = useRef<ChartHandle>(null);
  return (
    <div className={styles.plot}>
      <div className={styles.plotTitle}>
        <h2>{plot.title}</h2>
        <SavePlotMenu plot={plot} chart={chart} />
      </div>
      <CurvesChart ref={chart} plot={plot} height={height} />
    </div>
  );
}
