import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { type Billing, changeSeats, seatPreviewQuery } from '../../api/billing';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useDebounced } from '../../components/useDebounced';
import styles from './Billing.module.css';
import { previewText } from './previewText';
import { SeatsInput } from './SeatsInput';
import { useBillingAct } from './useBillingAct';
import { useSeatsToAdd } from './useSeatsToAdd';

/** More or fewer seats: what it costs is said before it is done. */
export function SeatsForm({ billing: { seats, usedSeats } }: { billing: Billing }) {
  const [wanted, setWanted] = useState(seats + useSeatsToAdd());
  const asked = useDebounced(wanted, 300);
  const isChange = wanted !== seats;
  const { data: preview, error } = useQuery({
    ...seatPreviewQuery(asked),
    enabled: isChange && asked === wanted,
  });
  const change = useBillingAct(changeSeats);
  const ready = isChange && preview?.seats === wanted ? preview : null;
  const problem = change.error ?? (isChange ? error : null);
  return (
    <section className={styles.section} aria-labelledby="seats-heading">
      <h2 id="seats-heading">More or fewer seats</h2>
      <p>{usedText(usedSeats)}</p>
      <div className={styles.act}>
        <SeatsInput id="seats" value={wanted} least={Math.max(1, usedSeats)} onChange={setWanted} />
        {isChange && (
          <Button
            type="primary"
            disabled={ready === null}
            loading={change.isPending}
            onClick={() => ready && change.mutate(ready)}
          >
            {`Change to ${wanted} ${wanted === 1 ? 'seat' : 'seats'}`}
          </Button>
        )}
        {isChange && <Button onClick={() => setWanted(seats)}>Leave it at {seats}</Button>}
      </div>
      <p role="status">{ready ? previewText(ready) : ''}</p>
      {problem && <FieldMessage>{detailOf(problem)}</FieldMessage>}
    </section>
  );
}

function usedText(used: number): string {
  const taken = used === 1 ? 'One is taken' : `${used} are taken`;
  return `${taken} by members and open invitations: fewer can’t be kept.`;
}
