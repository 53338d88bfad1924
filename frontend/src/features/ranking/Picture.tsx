import type { RankingRequest } from '@roothertz/common/conditions';
import { Tabs } from 'antd';
import { useMemo, useRef, useState } from 'react';
import type { CurvesPlot } from '../../components/charts/curve';
import { CurvesChart } from '../../components/charts/CurvesChart';
import type { ChartHandle } from '../../components/charts/EChart';
import { plotCsv } from '../../components/charts/plotCsv';
import { SavePlotMenu } from '../../components/charts/SavePlotMenu';
import { frequencyPlot } from './frequencyPlot';
import { QuietestMapView } from './map/QuietestMapView';
import styles from './Picture.module.css';
import type { PricePlot } from './price/pricePlot';
import { PriceView } from './price/PriceView';
import { resistancePlot } from './resistancePlot';
import type { SelectedPart } from './useSelectedPart';

const TABS = [
  { key: 'resistance', label: 'Resistance' },
  { key: 'frequency', label: 'Frequency' },
  { key: 'price', label: 'Price' },
  { key: 'map', label: 'Quietest map' },
] as const;
type Tab = (typeof TABS)[number]['key'];

const LARGE = 204;
const SMALL = 162;

interface PictureProps {
  selected: SelectedPart;
  request: RankingRequest;
  /** Moves the conditions to a place of the map. */
  onMove: (request: RankingRequest) => void;
  prices: PricePlot;
  /** Which of the prices' points is selected. */
  chosen: string;
  onSelect: (id: string) => void;
}

/** The selected part over the floor: the chosen curves large, the others below; noise against price; or the quietest map. */
export function Picture({ selected, request, onMove, ...priced }: PictureProps) {
  const [tab, setTab] = useState<Tab>('resistance');
  const plots = useMemo(() => plotsOf(selected, request), [selected, request]);
  const contents = {
    resistance: () => <Plots large={plots.resistance} small={plots.frequency} />,
    frequency: () => <Plots large={plots.frequency} small={plots.resistance} />,
    price: () => <PriceView plot={priced.prices} selectedId={priced.chosen} onSelect={priced.onSelect} />,
    map: () => <QuietestMapView request={request} selectedId={selected.part.id} onMove={onMove} />,
  };
  return (
    <section aria-label="Picture" className={styles.picture} id="picture">
      <Tabs
        size="small"
        activeKey={tab}
        onChange={(key) => setTab(key as Tab)}
        items={TABS.map((item) => ({ ...item, children: item.key === tab && contents[item.key]() }))}
        tabBarStyle={{ marginBottom: 4 }}
        tabBarGutter={20}
      />
    </section>
  );
}

function plotsOf({ part, compared }: SelectedPart, { conditions }: RankingRequest) {
  return {
    resistance: resistancePlot(conditions, part, compared),
    frequency: frequencyPlot(conditions, part, compared),
  };
}

function Plots({ large, small }: { large: CurvesPlot; small: CurvesPlot }) {
  return (
    <>
      <Plot plot={large} height={LARGE} />
      <Plot plot={small} height={SMALL} />
    </>
  );
}

function Plot({ plot, height }: { plot: CurvesPlot; height: number }) {
  const chart = useRef<ChartHandle>(null);
  const saved = useMemo(() => ({ title: plot.title, csv: () => plotCsv(plot) }), [plot]);
  return (
    <div className={styles.plot}>
      <div className={styles.plotTitle}>
        <h2>{plot.title}</h2>
        <SavePlotMenu plot={saved} chart={chart} />
      </div>
      <CurvesChart ref={chart} plot={plot} height={height} />
    </div>
  );
}
