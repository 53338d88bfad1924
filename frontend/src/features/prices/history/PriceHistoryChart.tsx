import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useMemo } from 'react';
import { type Offer, priceHistoryQuery } from '../../../api/prices';
import { EChart } from '../../../components/charts/EChart';
import { useTokens } from '../../../components/useTokens';
import { priceHistoryOption } from './priceHistoryOption';
import styles from './PricePanel.module.css';
import { type PriceLine, priceLines } from './priceSteps';

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
  const all = useMemo(
    () => (history ? priceLines(history, offers, dataUpdatedAt) : []),
    [history, offers, dataUpdatedAt],
  );
  const lines = useMemo(() => all.filter(isPriced), [all]);
  const option = useMemo(
    () => history && priceHistoryOption(lines, history.currency, tokens, HEIGHT),
    [history, lines, tokens],
  );
  if (!history || !option) return <Skeleton title={false} paragraph={{ rows: 5 }} />;
  if (lines.length === 0)
    return (
      <p>Its offers are in currencies without an exchange rate: enter one under “Currency and rates”.</p>
    );
  const label = `Price at ${quantity} over time: ${lines.map(({ name }) => name).join(', ')}`;
  const without = all.filter((line) => !isPriced(line)).map(({ name }) => name);
  const isConverted = offers.some(({ currency }) => currency !== history.currency);
  return (
    <div>
      <EChart option={option} label={label} height={HEIGHT} />
      <p className={styles.note}>
        {isConverted && `In ${history.currency} at the rates of today. `}
        {without.length > 0 && `Not drawn, for want of a rate: ${without.join(', ')}.`}
      </p>
    </div>
  );
}

function isPriced({ points }: PriceLine): boolean {
  return points.some(([, price]) => price !== null);
}
