import { useMemo, useRef } from 'react';
import { Link } from 'react-router-dom';
import type { ChartHandle } from '../../../components/charts/EChart';
import { SavePlotMenu } from '../../../components/charts/SavePlotMenu';
import pictureStyles from '../Picture.module.css';
import { PriceChart } from './PriceChart';
import { pricePlotCsv, type PricePlot } from './pricePlot';
import styles from './PriceView.module.css';

interface PriceViewProps {
  plot: PricePlot;
  selectedId: string;
  onSelect: (id: string) => void;
}

/** Noise against price with its frontier, and what has no price. */
export function PriceView({ plot, selectedId, onSelect }: PriceViewProps) {
  const chart = useRef<ChartHandle>(null);
  const saved = useMemo(() => ({ title: plot.title, csv: () => pricePlotCsv(plot) }), [plot]);
  if (plot.points.length === 0)
    return (
      <p className={styles.note}>
        Nothing that is ranked has a price. Prices come from the offers under <Link to="/prices">Prices</Link>
        .
      </p>
    );
  return (
    <>
      <div className={pictureStyles.plotTitle}>
        <h2>{plot.title}</h2>
        <SavePlotMenu plot={saved} chart={chart} />
      </div>
      <PriceChart ref={chart} plot={plot} selectedId={selectedId} onSelect={onSelect} />
      <p className={styles.note}>
        ◆ frontier: nothing that is ranked is both as quiet and as cheap. ○ the others, as far as the list is
        loaded.
      </p>
      {plot.unpriced.length > 0 && <Unpriced names={plot.unpriced.map(({ partNumber }) => partNumber)} />}
    </>
  );
}

const SHOWN = 6;

function Unpriced({ names }: { names: readonly string[] }) {
  const more = names.length > SHOWN ? ` and ${names.length - SHOWN} more` : '';
  return (
    <p className={styles.note}>
      Without a price: {names.slice(0, SHOWN).join(', ')}
      {more}.
    </p>
  );
}
