import { useQuery } from '@tanstack/react-query';
import { Button, Segmented } from 'antd';
import { useMemo, useState } from 'react';
import { type OfferedPart, partOffersQuery } from '../../../api/prices';
import { detailOf } from '../../../api/problem';
import { formatDay } from '../../../components/formatDay';
import { offerEvents } from './offerEvents';
import { PriceHistoryChart } from './PriceHistoryChart';
import styles from './PricePanel.module.css';

interface PricePanelProps {
  part: OfferedPart;
  usedIn: readonly string[];
  onClose: () => void;
}

const QUANTITIES = [1, 10, 100, 1000];

/** A part's prices over time, and who changed what. */
export function PricePanel({ part, usedIn, onClose }: PricePanelProps) {
  const [quantity, setQuantity] = useState(100);
  const { data, error } = useQuery(partOffersQuery(part.id));
  const offers = useMemo(() => (data ? [...data.current, ...data.history] : []), [data]);
  return (
    <section aria-label={`Price history of ${part.partNumber}`} className={styles.panel}>
      <div className={styles.head}>
        <h2>
          {part.partNumber} <span className={styles.quiet}>{part.manufacturer}</span>
        </h2>
        <span className={styles.quiet}>{usedIn.length > 0 && `used in ${usedIn.join(', ')}`}</span>
        <Segmented
          size="small"
          aria-label="Price at a quantity of"
          options={QUANTITIES.map((value) => ({ value, label: `at ${value}` }))}
          value={quantity}
          onChange={setQuantity}
        />
        <Button type="text" size="small" onClick={onClose}>
          Close
        </Button>
      </div>
      {error && <p role="alert">{detailOf(error)}</p>}
      {data && offers.length === 0 && <p className={styles.quiet}>Nobody has offered this part yet.</p>}
      {data && offers.length > 0 && (
        <div className={styles.body}>
          <PriceHistoryChart partId={part.id} quantity={quantity} offers={offers} />
          <ol className={styles.events} aria-label="Changes, the latest first">
            {offerEvents(data).map(({ id, at, who, supplier, changes }) => (
              <li key={`${id} ${at}`}>
                <span className={styles.quiet}>
                  {formatDay(at)}
                  {who !== null && `, ${who}`}
                </span>{' '}
                {supplier}: {changes.join('; ')}
              </li>
            ))}
          </ol>
        </div>
      )}
    </section>
  );
}
