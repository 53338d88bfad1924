import { useId, useImperativeHandle, useMemo, useRef, type Ref } from 'react';
import type { QuietestMap } from '../../../api/quietestMap';
import type { ChartHandle } from '../../../components/charts/EChart';
import { useTokens } from '../../../components/useTokens';
import { MapDrawing } from './MapDrawing';
import { MAP_HEIGHT, MAP_WIDTH, mapGeometry } from './mapGeometry';
import { MapMarks } from './MapMarks';
import { cellText, presentText } from './mapWords';
import styles from './QuietestMap.module.css';
import { useMapCursor } from './useMapCursor';

interface QuietestMapChartProps {
  map: QuietestMap;
  selectedId: string;
  present: { resistance: number; frequency: number };
  onMove: (resistance: number, frequency: number) => void;
  ref: Ref<ChartHandle>;
}

/** The map; hover or arrow keys tell what is quietest in a cell, a click or Enter moves the conditions there. */
export function QuietestMapChart({ map, selectedId, present, onMove, ref }: QuietestMapChartProps) {
  const tokens = useTokens();
  const id = useId();
  const svg = useRef<SVGSVGElement>(null);
  const geometry = useMemo(() => mapGeometry(map), [map]);
  const presentCell = geometry.cellAt(geometry.xOf(present.resistance), geometry.yOf(present.frequency));
  const { cursor, handlers } = useMapCursor(map, geometry, presentCell, ({ column, row }) =>
    onMove(map.resistances[column], map.frequencies[row]),
  );
  useImperativeHandle(ref, () => ({ svg: () => svg.current && drawingOf(svg.current) }), []);
  return (
    <>
      <div
        role="application"
        tabIndex={0}
        className={styles.chart}
        aria-label="Quietest map. Arrow keys look at a cell, Enter moves the conditions there."
        {...handlers}
      >
        <MapDrawing ref={svg} id={id} map={map} geometry={geometry} tokens={tokens} selectedId={selectedId}>
          <MapMarks geometry={geometry} tokens={tokens} present={present} cursor={cursor} />
        </MapDrawing>
      </div>
      <p className={styles.cell} aria-live="polite">
        {cursor ? cellText(map, cursor) : presentText(map, presentCell, present)}
      </p>
    </>
  );
}

function drawingOf(svg: SVGSVGElement) {
  return { text: new XMLSerializer().serializeToString(svg), width: MAP_WIDTH, height: MAP_HEIGHT };
}
