import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useMemo } from 'react';
import { type Offer, priceHistoryQuery } from '../../../api/prices';
import { EChart } from '../../../components/charts/EChart';
import { useTokens } from '../../../components/useTokens';
import { priceHistoryOption } from './priceHistoryOption';
import { priceLines } from './priceSteps';

interface PriceHistoryChartProps {
  partId: string;
  quantity: number;
  offers: readonly Offer[];
}

const HEIGHT = 190;

/** What the part cost at a quantity over time, in the team's currency at the rates of today. */
export function PriceHistoryChart({ partId, quantity, offers }: PriceHistoryChartProps) {
  const { data: history, dataUpdatedAt } = useQuery(priceHistoryQuery(partId, quantity));
  const tokens = useTokens();
  const lines = useMemo(
    () => (history ? priceLines(history, offers, dataUpdatedAt) : []),
    [history, offers, dataUpdatedAt],
  );
  const option = useMemo(
    () => history && priceHistoryOption(lines, history.currency, tokens),
    [history, lines, tokens],
  );
  if (!option) return <Skeleton title={false} paragraph={{ rows: 5 }} />;
  if (lines.every(({ points }) => points.every(([, price]) => price === null)))
    return (
      <p>Its offers are in currencies without an exchange rate: enter one under “Currency and rates”.</p>
    );
  const label = `Price at ${quantity} over time: ${lines.map(({ name }) => name).join(', ')}`;
  return <EChart option={option} label={label} height={HEIGHT} />;
}
