import { useImperativeHandle, useMemo, useRef, type Ref } from 'react';
import { formatQuantity } from '@roothertz/common/units';
import type { ChartHandle } from '../../../components/charts/EChart';
import { useTokens } from '../../../components/useTokens';
import mapStyles from '../map/QuietestMap.module.css';
import { priceText } from '../../../components/priceText';
import { PriceDrawing } from './PriceDrawing';
import { PRICE_HEIGHT, PRICE_WIDTH, priceGeometry } from './priceGeometry';
import type { PricePlot, PricePoint } from './pricePlot';
import { usePointCursor } from './usePointCursor';

interface PriceChartProps {
  plot: PricePlot;
  selectedId: string;
  onSelect: (id: string) => void;
  ref: Ref<ChartHandle>;
}

/** Noise against price; hover or arrow keys tell of a part, a click or Enter selects it. */
export function PriceChart({ plot, selectedId, onSelect, ref }: PriceChartProps) {
  const tokens = useTokens();
  const svg = useRef<SVGSVGElement>(null);
  const geometry = useMemo(() => priceGeometry(plot), [plot]);
  const selected = plot.points.find(({ id }) => id === selectedId);
  const { cursor, handlers } = usePointCursor(plot.points, geometry, selected, onSelect);
  useImperativeHandle(ref, () => ({ svg: () => svg.current && drawingOf(svg.current) }), []);
  const told = cursor ?? selected;
  return (
    <>
      <div
        role="application"
        tabIndex={0}
        className={mapStyles.chart}
        aria-label={`${plot.title}. Arrow keys look at a part, Enter selects it.`}
        {...handlers}
      >
        <PriceDrawing
          ref={svg}
          plot={plot}
          geometry={geometry}
          tokens={tokens}
          selected={selected}
          cursor={cursor}
        />
      </div>
      <p className={mapStyles.cell} aria-live="polite">
        {told ? pointText(told, plot) : 'What is selected has no price.'}
      </p>
    </>
  );
}

/** "VR-1108: €3.20 at 100, 67.8 nV rms, on the frontier" */
function pointText(
  { name, price, noise, isOnFrontier }: PricePoint,
  { currency, quantity, kind }: PricePlot,
) {
  const cost = priceText({ amount: String(price), currency });
  const where = isOnFrontier ? ', on the frontier' : '';
  return `${name}: ${cost} at ${quantity}, ${formatQuantity(noise, kind)} rms${where}`;
}

function drawingOf(svg: SVGSVGElement) {
  return { text: new XMLSerializer().serializeToString(svg), width: PRICE_WIDTH, height: PRICE_HEIGHT };
}
