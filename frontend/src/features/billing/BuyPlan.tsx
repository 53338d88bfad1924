import { Button } from 'antd';
import { useState } from 'react';
import { type Billing, checkoutAddress, type Money } from '../../api/billing';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Billing.module.css';
import { monthlyText } from './moneyText';
import { SeatsInput } from './SeatsInput';
import { useLeaveFor } from './useBillingAct';
import { useSeatsToAdd } from './useSeatsToAdd';

/** Buying the Team plan: how many seats, and what they cost. */
export function BuyPlan({ billing, seatPrice }: { billing: Billing; seatPrice: Money }) {
  const { usedSeats, standing } = billing;
  const [seats, setSeats] = useState(usedSeats + useSeatsToAdd());
  const checkout = useLeaveFor(checkoutAddress);
  return (
    <section className={styles.section} aria-labelledby="buy">
      <h2 id="buy">Buy the Team plan</h2>
      <p>
        A seat for each person. You pay at the payment service, by the month; the plan begins when it is paid
        {standing === 'trial' && ', and what is left of the trial ends then'}.
      </p>
      <div className={styles.act}>
        <SeatsInput id="seats-to-buy" value={seats} least={usedSeats} onChange={setSeats} />
        <span>{monthlyText(seatPrice, seats)} a month</span>
        <Button
          type="primary"
          onClick={() => checkout.mutate(seats)}
          loading={checkout.isPending || checkout.isSuccess}
        >
          Go to payment
        </Button>
      </div>
      {checkout.error && <FieldMessage>{detailOf(checkout.error)}</FieldMessage>}
    </section>
  );
}
