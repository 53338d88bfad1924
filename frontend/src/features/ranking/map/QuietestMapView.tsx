import type { RankingRequest } from '@roothertz/common/conditions';
import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useId, useMemo, useRef } from 'react';
import { detailOf } from '../../../api/problem';
import { quietestMapQuery, type QuietestMap } from '../../../api/quietestMap';
import type { ChartHandle } from '../../../components/charts/EChart';
import { SavePlotMenu } from '../../../components/charts/SavePlotMenu';
import { percentText } from '../../../components/charts/shares';
import { FieldMessage } from '../../../components/FieldMessage';
import { useTokens } from '../../../components/useTokens';
import pictureStyles from '../Picture.module.css';
import { mapCsv } from './mapCsv';
import { mapRequest, movedTo } from './mapRequest';
import { mapShares } from './mapWords';
import styles from './QuietestMap.module.css';
import { QuietestMapChart } from './QuietestMapChart';
import { TerritoryPattern } from './territoryStyles';

interface QuietestMapViewProps {
  request: RankingRequest;
  selectedId: string;
  onMove: (request: RankingRequest) => void;
}

const TITLE = 'Quietest map';

/** Which part is quietest where; the map before it stays while the next one is made. */
export function QuietestMapView({ request, selectedId, onMove }: QuietestMapViewProps) {
  const { conditions, filter } = request;
  const { data, error, isPlaceholderData } = useQuery(quietestMapQuery(mapRequest(conditions, filter)));
  const chart = useRef<ChartHandle>(null);
  const plot = useMemo(() => data && { title: TITLE, csv: () => mapCsv(data) }, [data]);
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data || !plot) return <Skeleton title={false} paragraph={{ rows: 11, width: '100%' }} />;
  const present = { resistance: conditions.source.resistance, frequency: conditions.referenceFrequency };
  return (
    <div aria-busy={isPlaceholderData} style={{ opacity: isPlaceholderData ? 0.5 : 1 }}>
      <div className={pictureStyles.plotTitle}>
        <h2>{TITLE}</h2>
        <SavePlotMenu plot={plot} chart={chart} />
      </div>
      <QuietestMapChart
        ref={chart}
        map={data}
        selectedId={selectedId}
        present={present}
        onMove={(resistance, frequency) => onMove(movedTo(request, resistance, frequency))}
      />
      <MapLegend map={data} />
    </div>
  );
}

/** The parts that win anywhere, with their share of the map. */
function MapLegend({ map }: { map: QuietestMap }) {
  const tokens = useTokens();
  const id = useId();
  if (map.parts.length === 0)
    return <p className={styles.cell}>No part is fast and stable enough anywhere.</p>;
  return (
    <ul className={styles.legend} aria-label="Parts of the map">
      {mapShares(map).map(({ index, name, share }) => (
        <li key={index}>
          <svg aria-hidden="true" width={14} height={11}>
            <defs>
              <TerritoryPattern id={`${id}-${index}`} index={index} tokens={tokens} />
            </defs>
            <rect
              width={14}
              height={11}
              fill={`url(#${id}-${index})`}
              stroke={tokens.muted}
              strokeWidth={0.8}
            />
          </svg>
          {name} <span>{percentText(share)}</span>
        </li>
      ))}
    </ul>
  );
}
